import { outOfRoundMm, taperMm, type DiameterGrid } from '$lib/kernel/geometry/diameter-grid';
import { shapeOf, type GridShape } from '$lib/kernel/geometry/grid-shape';
import type { Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../../working';
import type { ResultLine } from '../../worked';
import { figure } from '../formula-figures';
import { mm } from './faces';

export type Part = 'bore' | 'journal';
type Shown = { lines: ResultLine[]; working: Step[]; notes: string[] };

/** What one line of readings differs by, and where that is. */
export type Spread = { valueMm: number; at: number; readMm: readonly number[] };

/** Out-of-round at the depth that shows most of it. */
export function roundOf(rows: readonly (readonly number[])[]): Spread | undefined {
	return worstOf(rows, (row) => outOfRoundMm([row]));
}

/** Taper in the plane that shows most of it. */
export function taperOf(rows: readonly (readonly number[])[]): Spread | undefined {
	const planes = rows[0]?.map((_, plane) => rows.map((row) => row[plane] ?? 0)) ?? [];
	return worstOf(planes, (plane) => taperMm(plane.map((one) => [one])));
}

function worstOf(
	these: readonly (readonly number[])[],
	spread: (one: readonly number[]) => Outcome<number>
): Spread | undefined {
	let worst: Spread | undefined;
	for (const [at, readMm] of these.entries()) {
		const found = spread(readMm);
		if (found.ok && (!worst || found.value > worst.valueMm))
			worst = { valueMm: found.value, at, readMm };
	}
	return worst;
}

export function spreadStep(words: string, rule: string, { readMm, valueMm }: Spread): Step {
	return {
		words,
		rule,
		formula: `${figure(Math.max(...readMm))} − ${figure(Math.min(...readMm))}`,
		value: valueMm,
		...mm
	};
}

/** The shape along the part: a word for it, and the two measures that it goes by. */
export function shapeShown(part: Part, rows: DiameterGrid, noticedMm: number): Shown {
	const found = shapeOf(rows, noticedMm);
	if (!found.ok)
		return { lines: [], working: [], notes: [`The shape is not judged: ${found.because}.`] };
	const { profileMm, taperMm: taper, endsLessMiddleMm: ends } = found.value;
	const [first = 0, last = 0] = [profileMm[0], profileMm.at(-1)];
	const between = profileMm.slice(1, -1);
	const sum = between.map((one) => figure(one, 4)).join(' + ');
	const middle = between.length > 1 ? `(${sum}) / ${between.length}` : sum;
	return {
		lines: [
			{ key: 'shape', words: 'Shape along it', text: shapeWords(part, found.value) },
			{ key: 'ends', words: 'Ends less middle, means of the depths', value: ends, ...mm }
		],
		working: [
			{
				words: `Means of the depths: ${profileMm.map((one) => figure(one, 4)).join(', ')} mm. The first less the last`,
				rule: 'm1 − mn',
				formula: `${figure(first, 4)} − ${figure(last, 4)}`,
				value: taper,
				...mm
			},
			{
				words: 'Ends less middle',
				rule: '(m1 + mn) / 2 − mean of the depths between',
				formula: `(${figure(first, 4)} + ${figure(last, 4)}) / 2 − ${middle}`,
				value: ends,
				...mm
			}
		],
		notes: []
	};
}

function shapeWords(part: Part, { name, taperMm: taper }: GridShape): string {
	if (name === 'straight') return 'straight, as far as these readings tell';
	if (name === 'tapered')
		return `tapered, ${taper > 0 ? 'widest at the first depth' : 'widest at the last depth'}`;
	if (name === 'barrel')
		return part === 'bore' ? 'barrel, widest in the middle' : 'barrel, thickest in the middle';
	return part === 'bore' ? 'bell-mouthed, widest at its ends' : 'hourglass, thinnest in the middle';
}
