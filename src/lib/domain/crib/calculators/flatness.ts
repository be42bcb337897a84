import { faceLines, facePoints, worstLine, type FaceGrid } from '$lib/kernel/geometry/flatness';
import { heightsUnderEdge } from '$lib/kernel/geometry/straight-edge';
import { computed, type Outcome } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { choice, grid, list, quantity } from '../field';
import type { Worked } from '../worked';
import { plain } from './formula-figures';
import { drawnFace } from './flatness/drawn';
import { overallByDial, overallByFeeler, type Overall } from './flatness/overall';
import { presetsOf } from './flatness/presets';
import { ruledAgainst } from './ruled-against';
import { lineStep, stretchWords } from './flatness/steps';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const limit = { ...length, decimals: 3, least: 0, most: 10, optional: true } as const;
const mm = { unit: 'mm', decimals: 3 };

/** A face from heights or from gaps under a straight edge: overall, and within any stretch. */
export const flatness = calculator({
	key: 'flatness',
	title: 'Flatness of a face',
	says: 'How far a head, a block deck or a flange departs from flat, overall and within any short stretch, and which readings say so.',
	drawer: 'faces',
	caution:
		'Take burrs and gasket off first, and measure cold and unbolted. A warped head that is ground flat may have lost the line of its cam bearings, its height and the depth of its valves: look at these before anything is cut.',
	formulas: [
		'geometry/flatness',
		'geometry/straightness',
		'geometry/largest-gap',
		'geometry/of-weighted-readings',
		'measurement/ruling'
	],
	sources: [
		'A stretch slides along the rows and columns that were read, as a straight edge is laid. What lies between two readings nobody knows.'
	],
	fields: {
		how: choice({
			words: 'What the readings are',
			hint: 'A straight edge lies along the rows of the grid.',
			options: [
				{ value: 'heights', words: 'Heights by a dial' },
				{ value: 'gaps', words: 'Gaps under a straight edge' }
			],
			example: 'heights'
		}),
		along: list({
			...length,
			words: 'Places along the face',
			hint: 'From one end, one for each column.',
			example: '0; 65; 130; 195; 260'
		}),
		across: list({
			...length,
			words: 'Places across it',
			hint: 'From one side, one for each row.',
			example: '0; 45; 90'
		}),
		readings: grid({
			...length,
			words: 'Readings',
			hint: 'Leave a cell empty over a bore or a hole.',
			row: 'Row',
			column: 'Place',
			rows: { from: 3, least: 1, most: 12 },
			columns: { from: 5, least: 2, most: 16 },
			example: '0.000_0.021_0.034_0.030_0.012*0.004__0.041__0.022*0.010_0.031_0.048_0.043_0.028'
		}),
		buildMost: quantity({ ...limit, words: 'Most overall, to build', example: '0.03' }),
		runMost: quantity({ ...limit, words: 'Most overall, to run again', example: '0.05' }),
		stretch: quantity({
			...length,
			words: 'Stretch with a limit of its own',
			hint: 'Any 100 mm, say. It needs three readings in it.',
			decimals: 0,
			least: 10,
			most: 2000,
			optional: true,
			example: '130'
		}),
		stretchMost: quantity({ ...limit, words: 'Most within that stretch', example: '0.02' }),
		uncertainty: quantity({
			...limit,
			words: 'Expanded uncertainty of one reading',
			hint: 'With it and a limit the result is ruled.',
			example: '0.004'
		})
	},
	work({ how, along, across, readings, buildMost, runMost, stretch, stretchMost, uncertainty }) {
		const typed = withoutEmptyEdges(readings);
		const heights = how === 'gaps' ? heightsUnderEdge(typed) : computed(typed);
		if (!heights.ok) return heights;
		const face = { alongMm: along, acrossMm: across, heightMm: heights.value };
		const points = facePoints(face);
		if (!points.ok) return points;
		const overall =
			how === 'gaps' ? overallByFeeler(typed, points.value) : overallByDial(points.value);
		if (!overall.ok) return overall;
		return withLines(face, overall.value, how, {
			overall: { build: buildMost, 'run-again': runMost },
			stretchMm: stretch,
			stretchMost,
			uncertainty
		});
	},
	presets: presetsOf
});

type Limits = {
	overall: { build: number | undefined; 'run-again': number | undefined };
	stretchMm: number | undefined;
	stretchMost: number | undefined;
	uncertainty: number | undefined;
};

function withLines(
	face: FaceGrid,
	overall: Overall,
	how: 'heights' | 'gaps',
	limits: Limits
): Outcome<Worked> {
	const lines = faceLines(face, how === 'gaps' ? 'along' : 'both');
	if (!lines.ok) return lines;
	const { stretchMm, stretchMost, uncertainty } = limits;
	const whole = worstLine(lines.value);
	const within = stretchMm === undefined ? undefined : worstLine(lines.value, stretchMm);
	const worst = within?.ok ? within.value : whole.ok ? whole.value : undefined;
	const rulings = ruledAgainst(
		[
			{ of: overall.words, valueMm: overall.valueMm, weights: overall.weights, ...limits.overall },
			...(within?.ok && stretchMm !== undefined
				? [
						{
							of: stretchWords(stretchMm),
							valueMm: within.value.widthMm,
							weights: within.value.weights,
							'run-again': stretchMost
						}
					]
				: [])
		],
		uncertainty
	);
	if (!rulings.ok) return rulings;
	return computed({
		lines: [
			{ key: 'overall', words: overall.words, value: overall.valueMm, ...mm, main: true },
			...(within?.ok && stretchMm !== undefined
				? [
						{
							key: 'stretch',
							words: stretchWords(stretchMm),
							value: within.value.widthMm,
							...mm,
							main: true
						}
					]
				: []),
			...(whole.ok
				? [{ key: 'line', words: 'Worst whole line', value: whole.value.widthMm, ...mm }]
				: [])
		],
		working: [
			...overall.steps,
			...(within?.ok && stretchMm !== undefined
				? [lineStep(within.value, `within ${plain(stretchMm)} mm`)]
				: []),
			...(whole.ok ? [lineStep(whole.value, 'end to end')] : []),
			...rulings.value.steps
		],
		rulings: rulings.value.rulings,
		notes: [
			...(within && !within.ok ? [`The stretch is not judged: ${within.because}.`] : []),
			...overall.notes
		],
		drawing: drawnFace(face, overall, worst)
	});
}

/** A grid opens with more cells than a small face has places: those that nobody typed in are cut. */
function withoutEmptyEdges(rows: readonly (readonly (number | null)[])[]): (number | null)[][] {
	const empty = (cells: readonly (number | null)[]) => cells.every((one) => one === null);
	const last = rows.findLastIndex((row) => !empty(row));
	const wide = Math.max(...rows.map((row) => row.findLastIndex((one) => one !== null)));
	return rows
		.slice(0, last + 1)
		.map((row) => Array.from({ length: wide + 1 }, (_, at) => row[at] ?? null));
}
