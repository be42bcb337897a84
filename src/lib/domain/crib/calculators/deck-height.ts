import { deckHeight as heightOf, type Deck } from '$lib/kernel/geometry/end-play';
import { gasketFor, type GasketClass } from '$lib/kernel/geometry/gasket-class';
import { ofWeightedReadingsMm } from '$lib/kernel/geometry/weighted-readings';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { quantity, table, type TableRow } from '../field';
import { length, mm, uncertaintyOf } from './bores/faces';
import { limitsOf, ruledBetween } from './bores/ruled-between';
import { bracketed, figure } from './formula-figures';

const height = { ...length, decimals: 3, least: -20, most: 20, optional: true } as const;

/** Pistons at top dead centre against the deck, and the gasket that they call for. */
export const deckHeight = calculator({
	key: 'deck-height',
	title: 'Piston height at the deck',
	says: 'How far each piston stands proud of the block’s deck at top dead centre, and which gasket the highest one calls for.',
	drawer: 'bores',
	caution:
		'Hold the liners down and turn the shaft by hand. A gasket too thin lets a piston strike the head, one too thick costs compression: read every piston, the highest decides.',
	formulas: ['geometry/deck-height', 'geometry/of-weighted-readings', 'measurement/ruling'],
	sources: [
		'One gasket for all cylinders, chosen by the highest piston: method of diesel service manuals, common practice.'
	],
	fields: {
		pistons: table({
			...length,
			words: 'Readings on the crowns',
			hint: 'Dial set to zero on the deck; above zero stands proud, below zero lies under it. Read both ends of the pin axis, where rocking cancels.',
			row: 'Piston',
			columns: [
				{ key: 'first', words: 'One end', of: 'quantity' },
				{ key: 'second', words: 'Other end', of: 'quantity' }
			],
			rows: { from: 4, least: 1, most: 12 },
			example: '0.52_0.56*0.50_0.55*0.55_0.59*0.51_0.53'
		}),
		classes: table({
			...length,
			words: 'Classes of gasket',
			hint: 'As printed: the height of the highest piston that each is for.',
			row: 'Class',
			columns: [
				{ key: 'name', words: 'Mark', of: 'text' },
				{ key: 'least', words: 'From', of: 'quantity' },
				{ key: 'most', words: 'To', of: 'quantity' }
			],
			rows: { from: 3, least: 1, most: 8 },
			optional: true,
			example: '1 notch_0.40_0.49*2 notches_0.50_0.59*3 notches_0.60_0.69'
		}),
		least: quantity({ ...height, words: 'Least height, to build', example: '0.4' }),
		most: quantity({ ...height, words: 'Most height, to build', example: '0.69' }),
		uncertainty: uncertaintyOf('Uncertainty of one dial reading', '0.008')
	},
	work({ pistons, classes = [], least, most, uncertainty }) {
		const read = heightsOf(pistons);
		if (!read.ok) return read;
		const heights = read.value.found.map((one) => one.heightMm);
		const highest = heights.indexOf(Math.max(...heights));
		const listed = classesOf(classes);
		const gasket = listed.length > 0 ? gasketFor(heights, listed) : undefined;
		const rulings = ruled(heights, { least, most, uncertainty });
		if (!rulings.ok) return rulings;
		return computed({
			lines: [
				{
					key: 'highest',
					words: `Highest, piston ${highest + 1}`,
					value: heights[highest] ?? 0,
					...mm,
					main: true
				},
				...(gasket
					? [
							{
								key: 'gasket',
								words: 'Gasket',
								text: gasket.ok ? gasket.value.name : `none: ${gasket.because}`,
								main: true
							}
						]
					: []),
				...heights.flatMap((value, at) =>
					at === highest
						? []
						: [{ key: `piston-${at + 1}`, words: `Piston ${at + 1}`, value, ...mm }]
				),
				{
					key: 'rock',
					words: 'Most rock between both ends',
					value: Math.max(...read.value.found.map((one) => one.rockMm)),
					...mm
				}
			],
			working: read.value.steps,
			rulings: rulings.value,
			notes:
				gasket && !gasket.ok
					? ['Read the highest piston again before you look for another gasket.']
					: [],
			drawing: {
				kind: 'deck',
				pistons: heights.map((heightMm, at) => ({ name: String(at + 1), heightMm })),
				highest,
				classes: listed.map((one) => ({
					...one,
					chosen: gasket?.ok === true && gasket.value.name === one.name
				}))
			}
		});
	},
	presets: (sheet) =>
		sheet.dimensions
			.filter(({ key, unit, build }) => unit === 'mm' && build && /protrusion$/i.test(key))
			.map(({ key, words, build }) => ({
				key,
				words,
				values: { least: String(build?.least), most: String(build?.most) }
			}))
});

type Judged = { [K in 'least' | 'most' | 'uncertainty']: number | undefined };

/** The highest piston is held to the most, the lowest to the least. */
function ruled(heights: readonly number[], { least, most, uncertainty }: Judged) {
	const expanded =
		uncertainty === undefined ? undefined : ofWeightedReadingsMm([0.5, 0.5], uncertainty);
	if (expanded && !expanded.ok) return expanded;
	const held = (of: string, valueMm: number) => ({
		of: `${of}, piston ${heights.indexOf(valueMm) + 1}`,
		valueMm,
		expandedMm: expanded?.value
	});
	return ruledBetween([
		{ ...held('Highest', Math.max(...heights)), build: limitsOf(undefined, most) },
		{ ...held('Lowest', Math.min(...heights)), build: limitsOf(least, undefined) }
	]);
}

function heightsOf(rows: readonly TableRow[]): Outcome<{ found: Deck[]; steps: Step[] }> {
	const found: Deck[] = [];
	const steps: Step[] = [];
	for (const [at, { first, second }] of rows.entries()) {
		const read = [first, second].filter((one) => typeof one === 'number');
		const one = heightOf(read);
		if (!one.ok) return cannot(`piston ${at + 1}: ${one.because}`);
		found.push(one.value);
		steps.push({
			words: `Piston ${at + 1}: mean of both ends`,
			rule: 'h = (a + b) / 2',
			formula: `(${figure(read[0] ?? 0)} + ${bracketed(read[1] ?? 0)}) / 2`,
			value: one.value.heightMm,
			...mm
		});
	}
	return found.length > 0 ? computed({ found, steps }) : cannot('no piston is read yet');
}

function classesOf(rows: readonly TableRow[]): GasketClass[] {
	const number = (one: TableRow[string] | undefined) => (typeof one === 'number' ? one : NaN);
	return rows.map(({ name, least, most }) => ({
		name: String(name),
		leastMm: number(least),
		mostMm: number(most)
	}));
}
