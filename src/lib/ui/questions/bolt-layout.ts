import { apartMm, isRing, placedBolts, type Bolt } from '$lib/kernel/fasteners/bolt-pattern';

export type DrawnBolt = {
	id: string;
	x: number;
	y: number;
	/** Where its name stands; none where there is no room for it. */
	name?: { x: number; y: number };
};
export type BoltLayout = {
	width: number;
	height: number;
	/** Radius of a balloon. */
	balloon: number;
	bolts: DrawnBolt[];
	middle: { x: number; y: number };
	/** The bolt circle of a flange. */
	circle?: { radius: number; diameterMm: number };
	/** Outermost bolts, for the dimension lines. */
	box: { left: number; right: number; top: number; bottom: number };
	spanMm: { x: number; y: number };
};

/** Room from an outermost bolt to the outline: a balloon, a name, air. */
export const edge = 38;
const tall = 200;
const letter = 6.7;
const line = 12;

/**
 * Places a pattern's bolts on a drawing, to scale, so that balloons stand clear of each other and
 * of names: dense patterns are drawn wider, and a name without room is left to the list beside.
 */
export function boltLayout(bolts: readonly Bolt[], sized: boolean): BoltLayout {
	const [xs, ys] = [bolts.map((one) => one.xMm), bolts.map((one) => one.yMm)];
	const [least, most] = [Math.min(...xs), Math.max(...xs)];
	const [low, high] = [Math.min(...ys), Math.max(...ys)];
	const spanMm = { x: most - least, y: high - low };
	const scaleFor = (wide: number) =>
		Math.min(wide / Math.max(spanMm.x, 1e-9), tall / Math.max(spanMm.y, 1e-9));
	const room = sized ? 26 : 0;
	const wide = 320 - 2 * edge - room;
	const nearest = nearestMm(bolts);
	// Below eight a balloon does not hold two figures.
	const scale = Math.min(Math.max(scaleFor(wide), Math.min(2 * scaleFor(wide), 18 / nearest)), 1e6);
	const balloon = Math.min(13, Math.max(6, nearest * scale * 0.45));
	const width = Math.max(320, spanMm.x * scale + 2 * edge + room);
	const left = room + (width - room - spanMm.x * scale) / 2;
	const placed = bolts.map(({ id, xMm, yMm }) => ({
		id,
		x: left + (xMm - least) * scale,
		y: edge + (high - yMm) * scale
	}));
	const around = placedBolts(bolts);
	const ring = around.ok && isRing(around.value);
	const middle = {
		x: placed.reduce((sum, one) => sum + one.x, 0) / placed.length,
		y: placed.reduce((sum, one) => sum + one.y, 0) / placed.length
	};
	const reachMm = around.ok ? (around.value[0]?.reachMm ?? 0) : 0;
	return {
		width,
		height: spanMm.y * scale + 2 * edge + room,
		balloon,
		bolts: named(placed, balloon, middle, ring),
		middle,
		...(ring ? { circle: { radius: reachMm * scale, diameterMm: 2 * reachMm } } : {}),
		box: {
			left,
			right: left + spanMm.x * scale,
			top: edge,
			bottom: edge + spanMm.y * scale
		},
		spanMm
	};
}

function nearestMm(bolts: readonly Bolt[]): number {
	let nearest = Infinity;
	for (const [at, a] of bolts.entries())
		for (const b of bolts.slice(at + 1)) nearest = Math.min(nearest, apartMm(a, b));
	return Math.max(nearest, 1e-6);
}

type Box = { x: number; y: number; half: number };

/** Each name beside its bolt, away from the middle, wherever it touches nothing. */
function named(
	bolts: readonly DrawnBolt[],
	balloon: number,
	middle: { x: number; y: number },
	ring: boolean
): DrawnBolt[] {
	const taken: Box[] = [];
	return bolts.map((bolt) => {
		const half = (bolt.id.length * letter) / 2;
		const [dx, dy] = [bolt.x - middle.x, bolt.y - middle.y];
		const reach = Math.hypot(dx, dy) || 1;
		const radial = {
			x: (dx / reach) * (balloon + half + 3),
			y: (dy / reach) * (balloon + line / 2 + 3)
		};
		const upwards = { x: 0, y: -(balloon + line / 2 + 2) };
		const sideways = { x: balloon + half + 3, y: 0 };
		const [up, side] = [dy <= 0 ? 1 : -1, dx >= 0 ? 1 : -1];
		const tries = [
			...(ring ? [radial] : []),
			{ x: 0, y: up * upwards.y },
			{ x: side * sideways.x, y: 0 },
			{ x: 0, y: -up * upwards.y },
			{ x: -side * sideways.x, y: 0 }
		];
		const free = tries
			.map((by) => ({ x: bolt.x + by.x, y: bolt.y + by.y, half }))
			.find(
				(box) =>
					bolts.every(
						(other) =>
							Math.abs(other.x - box.x) >= balloon + half - 1 ||
							Math.abs(other.y - box.y) >= balloon + line / 2 - 1
					) &&
					taken.every(
						(other) =>
							Math.abs(other.x - box.x) >= other.half + half + 2 ||
							Math.abs(other.y - box.y) >= line
					)
			);
		if (!free) return bolt;
		taken.push(free);
		return { ...bolt, name: { x: free.x, y: free.y } };
	});
}
