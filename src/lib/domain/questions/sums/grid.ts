import { z } from 'zod';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Random } from '$lib/kernel/random/random';
import { bore } from '../../crib/calculators/bore';
import { journal } from '../../crib/calculators/journal';
import type { SheetFigure, SheetFigures } from '../sheet-figures';
import { sheetKeySchema } from '../words';
import { drawWorn, shown } from './draw-reading';
import { sumOf, type DrawnFigures } from './from-calculator';

export const gridParameters = z
	.strictObject({
		/** A bore or journal with limits to build and a wear limit. */
		of: sheetKeySchema,
		ask: z.enum(['out-of-round', 'taper', 'next-size']),
		/** The sheet's list of sizes that it is machined to. */
		steps: sheetKeySchema.optional()
	})
	.refine(({ ask, steps }) => (ask === 'next-size') === (steps !== undefined), {
		path: ['steps'],
		message: 'the next size wants the sheet’s list of steps, the others do not'
	});

type Parameters = z.infer<typeof gridParameters>;
type Part = 'bore' | 'journal';
type Drawn = DrawnFigures<(typeof bore)['fields']>;

/** What boring or grinding takes off at the least, in diameter, mm. */
const stockMm = 0.05;

/**
 * A whole grid of readings, of which one figure is asked. Three depths, two planes, in thousandths,
 * within 0.012 mm of the size drawn; drawn again until out-of-round and taper are 0.004 mm or more
 * each, and differ.
 * For the next size a listed size leaves its stock and 0.004 to 0.15 mm more at the worst reading,
 * so that no scatter of a reading changes which size it is.
 */
function gridSum(part: Part) {
	return sumOf({
		calculator: part === 'bore' ? bore : journal,
		parameters: gridParameters,
		sheetKeys: ({ of, steps }) => (steps === undefined ? [of] : [of, steps]),
		draw(asked, random, sheet) {
			const figure = sheet.figure(asked.of);
			if (!figure.ok) return figure;
			if (figure.value.wearsBy !== (part === 'bore' ? 'growing' : 'shrinking'))
				return cannot(`${figure.value.words} does not wear as a ${part} does`);
			for (let tries = 0; tries < 200; tries++) {
				const drawn = drawOnce(part, asked, figure.value, random, sheet);
				if (!drawn.ok) return drawn;
				if (isFair(part, asked.ask, drawn.value)) return drawn;
			}
			return cannot('no readings came out that are worth asking about');
		}
	});
}
export const boreGrid = gridSum('bore');
export const journalGrid = gridSum('journal');

function drawOnce(
	part: Part,
	{ of, ask, steps }: Parameters,
	figure: SheetFigure,
	random: Random,
	sheet: SheetFigures
): Outcome<Drawn> {
	const listed = steps === undefined ? undefined : sheet.steps(steps);
	if (listed && !listed.ok) return listed;
	const middle = listed
		? drawShortOf(part, figure, listed.value.stepsMm, random)
		: drawWorn(figure, random);
	if (!middle.ok) return middle;
	const readings = [0, 1, 2].map(() =>
		[0, 1].map(() => shown(middle.value + random.integer(-12, 12) / 1000, 3))
	);
	return computed({
		values: {
			readings,
			nominal: listed ? figure.nominal : undefined,
			printed: undefined,
			wearLimit: undefined,
			outOfRoundMost: undefined,
			taperMost: undefined,
			steps: listed?.value.stepsMm,
			stock: listed ? stockMm : undefined,
			uncertainty: undefined
		},
		ask,
		given: [
			...readings.flatMap((row, depth) =>
				row.map((value, plane) => ({
					words: `${figure.words}, depth ${depth + 1}, plane ${plane + 1}`,
					value,
					unit: 'mm',
					decimals: 3
				}))
			),
			...(listed
				? [{ words: 'Least to take off, in diameter', value: stockMm, unit: 'mm', decimals: 2 }]
				: [])
		],
		prompt: prompts[ask](listed?.value.words ?? of)
	});
}

/** A size that one of the listed steps still cleans up. */
function drawShortOf(
	part: Part,
	{ nominal, words }: SheetFigure,
	stepsMm: readonly number[],
	random: Random
): Outcome<number> {
	if (nominal === undefined) return cannot(`${words} has no standard size in the data sheet`);
	const off = random.pick(stepsMm) - stockMm - random.between(0.02, 0.15);
	return computed(nominal + (part === 'bore' ? off : -off));
}

function isFair(part: Part, ask: Parameters['ask'], { values }: Drawn): boolean {
	const worked = (part === 'bore' ? bore : journal).work(values);
	if (!worked.ok) return false;
	const figure = (key: string) => {
		const line = worked.value.lines.find((one) => one.key === key);
		return line && 'value' in line ? line.value : NaN;
	};
	const [round, taper] = [figure('out-of-round'), figure('taper')];
	if (!(round >= 0.004) || !(taper >= 0.004) || round === taper) return false;
	return ask !== 'next-size' || figure('left') >= stockMm + 0.004;
}

const prompts: Record<Parameters['ask'], (words: string) => string> = {
	'out-of-round': () =>
		'Three depths were read in two planes. How far is it out of round, at its worst?',
	taper: () => 'Three depths were read in two planes. What is its taper, at its worst?',
	'next-size': (words) =>
		`It is to be machined. By the standard size and by “${words}” in the data sheet, to which size is it machined next?`
};
