import type { Cell, WorstLine } from '$lib/kernel/geometry/flatness';
import type { FacePoint } from '$lib/kernel/geometry/minimum-zone';
import type { Step } from '../../../working';
import { bracketed, figure, plain } from '../formula-figures';

const mm = { unit: 'mm', decimals: 3 };

export function placeWords({ row, column }: Cell): string {
	return `row ${row + 1} place ${column + 1}`;
}

export function stretchWords(stretchMm: number): string {
	return `Worst within ${plain(stretchMm)} mm along a line`;
}

/** The width as a sum that a person can add up again: the readings held, each with its weight. */
export function zoneStep(
	points: readonly (FacePoint & Cell)[],
	held: readonly { at: number; weight: number }[],
	widthMm: number
): Step {
	const these = held.flatMap(({ at, weight }) => {
		const point = points[at];
		return point ? [{ point, weight }] : [];
	});
	if (these.length === 0) return { words: 'All readings lie in one plane', value: widthMm, ...mm };
	return {
		words: `No two parallel planes closer together hold all ${points.length} readings: the upper rests on ${where(these, 1)}, the lower on ${where(these, -1)}. What each has in the width, its weight, comes from where it lies`,
		rule: 'w = Σ weight · height',
		formula: these
			.map(({ point, weight }) => `${figure(weight, 4)} · ${bracketed(point.zMm)}`)
			.join(' + ')
			.replace(/\+ −/g, '− '),
		value: widthMm,
		...mm
	};
}

/** The three readings that hold a line, the middle one held against the other two. */
export function lineStep({ line, held, widthMm }: WorstLine, stretch: string): Step {
	const [a, b, c] = held.map((at) => ({ x: line.atMm[at] ?? 0, z: line.heightMm[at] ?? 0 }));
	const places = held.map((at) => (line.places[at] ?? 0) + 1).join(', ');
	const name = line.runs === 'along' ? `Row ${line.line + 1}` : `Column ${line.line + 1}`;
	return {
		words: `${name} ${stretch}, readings ${places}: the middle one off the straight line through the others`,
		rule: '|z2 − (z1 + (z3 − z1) · (x2 − x1) / (x3 − x1))|',
		...(a && b && c
			? {
					formula: `|${figure(b.z)} − (${figure(a.z)} + (${figure(c.z)} − ${bracketed(a.z)}) · ${plain(b.x - a.x)} / ${plain(c.x - a.x)})|`
				}
			: {}),
		value: widthMm,
		...mm
	};
}

function where(these: readonly { point: Cell; weight: number }[], side: 1 | -1): string {
	return these
		.filter(({ weight }) => weight * side > 0)
		.map(({ point }) => placeWords(point))
		.join(' and ');
}
