import type { WrenchDrawing } from '$lib/domain/crib/drawings/wrench';

export type Place = { x: number; y: number };
export const width = 320;
const side = 48;
/** The longest extension across is drawn this high. */
const tallest = 150;

/** Where the parts of a wrench and its labels lie on the drawing, all to one scale. */
export function wrenchLayout({ lengthMm, extensionMm, angleDeg }: WrenchDrawing) {
	const radians = (angleDeg * Math.PI) / 180;
	const along = extensionMm * Math.cos(radians);
	const across = extensionMm * Math.sin(radians);
	const from = Math.min(0, lengthMm + along);
	const to = Math.max(lengthMm, lengthMm + along);
	const scale = Math.min(
		(width - 2 * side) / (to - from),
		tallest / Math.max(Math.abs(across), 1e-9)
	);
	const left = (width - (to - from) * scale) / 2;
	const axis = 44 + Math.max(0, across * scale);
	const x = (mm: number) => left + (mm - from) * scale;
	const hand = { x: x(0), y: axis };
	const square = { x: x(lengthMm), y: axis };
	const fastener = { x: x(lengthMm + along), y: axis - across * scale };
	const below = axis + Math.max(0, -across * scale) + 22;
	/** Beside a place: a label keeps clear of it by its own half width. */
	const beside = (place: Place, dx: number, dy: number, gap: number, half: number): Place => ({
		x: Math.min(width - half - 2, Math.max(half + 2, place.x + dx * (gap + half))),
		y: place.y + dy * (gap + 7)
	});
	const [cos, sin] = [Math.cos(radians), Math.sin(radians)];
	const middle = { x: (square.x + fastener.x) / 2, y: (square.y + fastener.y) / 2 };
	// The side of the extension on which neither the handle nor the angle is drawn.
	const away = (angleDeg > 90 && angleDeg < 165) || (angleDeg > 195 && angleDeg < 270) ? -1 : 1;
	return {
		hand,
		square,
		fastener,
		height: below + 58,
		lines: { length: below + 8, effective: below + 34 },
		labels: {
			extension:
				extensionMm * scale < 40 ? undefined : beside(middle, -sin * away, -cos * away, 8, 20),
			angle: { x: square.x + 36, y: square.y - 19 },
			setting: { x: (hand.x + square.x) / 2, y: axis - 15 }
		},
		/** The angle from straight on to the extension; none where there is hardly any. */
		arc:
			angleDeg > 12 && extensionMm * scale > 20
				? `M${square.x + 26} ${square.y}A26 26 0 ${angleDeg > 180 ? 1 : 0} 0 ${square.x + 26 * cos} ${square.y - 26 * sin}`
				: undefined
	};
}

/** A hexagon around a place. */
export function hexagon({ x, y }: Place, radius: number): string {
	return Array.from({ length: 6 }, (_, at) => {
		const radians = (at * Math.PI) / 3;
		return `${x + radius * Math.cos(radians)},${y + radius * Math.sin(radians)}`;
	}).join(' ');
}
