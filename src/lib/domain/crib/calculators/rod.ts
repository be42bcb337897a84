import {
	outOfLinePer100Mm,
	outOfLineWeights,
	rodLengthMm,
	type MandrelReadings
} from '$lib/kernel/geometry/rod';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { grid, quantity } from '../field';
import type { FigureLine } from '../worked';
import { bracketed, figure, plain } from './formula-figures';
import { ruledAgainst } from './ruled-against';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const size = { ...length, decimals: 2, least: 1, most: 1000 } as const;
const limit = { ...length, decimals: 3, least: 0, most: 10, optional: true } as const;
const rows = ['Bend, small end', 'Bend, big end', 'Twist, small end', 'Twist, big end'];

/** Bend and twist of a connecting rod from a dial over its mandrels, brought to 100 mm. */
export const rod = calculator({
	key: 'rod',
	title: 'Bend and twist of a rod',
	says: 'How far the two ends of a connecting rod stand out of line, in 100 mm of mandrel, and whether the rod has lost length.',
	drawer: 'faces',
	caution:
		'A bent rod is replaced unless its maker allows straightening: what was bent cold has cracks to look for. Look for what bent it as well; liquid in the cylinder leaves a rod short.',
	formulas: [
		'geometry/rod-out-of-line',
		'geometry/rod-length',
		'geometry/of-weighted-readings',
		'measurement/ruling'
	],
	fields: {
		readings: grid({
			...length,
			words: 'Dial over the mandrels',
			hint: 'Bend with the rod upright, twist with it on its side. Leave the big end empty where the fixture holds it level.',
			row: 'Row',
			column: 'Side',
			rowNames: rows,
			columnNames: ['Near', 'Far'],
			rows: { from: 4, least: 4, most: 4 },
			columns: { from: 2, least: 2, most: 2 },
			example: '0.00_0.03*_*0.00_-0.06*_'
		}),
		apart: quantity({
			...size,
			words: 'Distance between the two readings, small end',
			example: '120'
		}),
		bigApart: quantity({
			...size,
			optional: true,
			words: 'The same, big end',
			hint: 'As at the small end where left out.',
			example: ''
		}),
		bendMost: quantity({ ...limit, words: 'Most bend in 100 mm', example: '0.05' }),
		twistMost: quantity({ ...limit, words: 'Most twist in 100 mm', example: '0.10' }),
		uncertainty: quantity({
			...limit,
			words: 'Expanded uncertainty of one reading',
			hint: 'With it and a limit the rod is ruled.',
			example: '0.01'
		}),
		over: quantity({ ...size, optional: true, words: 'Over both mandrels', example: '170.52' }),
		bigMandrel: quantity({ ...size, optional: true, words: 'Big end’s mandrel', example: '43.02' }),
		smallMandrel: quantity({
			...size,
			optional: true,
			words: 'Small end’s mandrel',
			example: '18.00'
		})
	},
	work({ readings, apart, bigApart, bendMost, twistMost, uncertainty, ...rest }) {
		const bend = plane(readings, 0, apart, bigApart ?? apart);
		if (!bend.ok) return bend;
		const twist = plane(readings, 2, apart, bigApart ?? apart);
		if (!twist.ok) return twist;
		const long = lengthOf(rest);
		if (!long.ok) return long;
		const planes = [
			{ key: 'bend', words: 'Bend', most: bendMost, ...bend.value },
			{ key: 'twist', words: 'Twist', most: twistMost, ...twist.value }
		];
		const rulings = ruledAgainst(
			planes.map(({ words, per100Mm, weights, most }) => ({
				of: `${words} in 100 mm`,
				valueMm: Math.abs(per100Mm),
				weights,
				'run-again': most
			})),
			uncertainty
		);
		if (!rulings.ok) return rulings;
		return computed({
			lines: [
				...planes.map(({ key, words, per100Mm }) => ({
					key,
					words: `${words} in 100 mm${sideWords(per100Mm)}`,
					value: Math.abs(per100Mm),
					unit: 'mm',
					decimals: 3,
					main: true
				})),
				...long.value.lines
			],
			working: [
				...planes.map(({ words, step }) => ({ ...step, words: `${words}: ${step.words}` })),
				...long.value.steps,
				...rulings.value.steps
			],
			rulings: rulings.value.rulings,
			notes: [
				'Turn the mandrels half a turn and read again: what stays is the rod, what changes is the mandrel.'
			],
			drawing: {
				kind: 'rod',
				bendPer100Mm: bend.value.per100Mm,
				twistPer100Mm: twist.value.per100Mm,
				...(long.value.lengthMm === undefined ? {} : { lengthMm: long.value.lengthMm })
			}
		});
	}
});

type Plane = { per100Mm: number; weights: number[]; step: Step };

/** The readings of one plane: a row of the small end, then one of the big end. */
function plane(
	readings: readonly (readonly (number | null)[])[],
	row: number,
	apart: number,
	bigApart: number
): Outcome<Plane> {
	const small = mandrel(readings[row], apart);
	const big = mandrel(readings[row + 1], bigApart);
	if (!small) return cannot(`“${rows[row]}” wants both readings`);
	if (!big && readings[row + 1]?.some((one) => one !== null))
		return cannot(
			`“${rows[row + 1]}” wants both readings, or none where the fixture holds it level`
		);
	const found = outOfLinePer100Mm(small, big);
	if (!found.ok) return found;
	const tilt = (one: MandrelReadings) =>
		`(${figure(one.farMm)} − ${bracketed(one.nearMm)}) / ${plain(one.apartMm)} · 100`;
	return computed({
		per100Mm: found.value,
		weights: outOfLineWeights(small, big),
		step: {
			words: big ? 'small end’s mandrel less big end’s' : 'small end’s mandrel',
			rule: `|(far − near) / S · 100${big ? ', less the same of the big end' : ''}|`,
			formula: `|${tilt(small)}${big ? ` − (${tilt(big)})` : ''}|`,
			value: Math.abs(found.value),
			unit: 'mm',
			decimals: 3
		}
	});
}

function mandrel(
	[nearMm = null, farMm = null]: readonly (number | null)[] = [],
	apartMm: number
): MandrelReadings | undefined {
	return nearMm === null || farMm === null ? undefined : { nearMm, farMm, apartMm };
}

function lengthOf(given: {
	over: number | undefined;
	bigMandrel: number | undefined;
	smallMandrel: number | undefined;
}): Outcome<{ lines: FigureLine[]; steps: Step[]; lengthMm?: number }> {
	const { over, bigMandrel, smallMandrel } = given;
	if (over === undefined || bigMandrel === undefined || smallMandrel === undefined)
		return computed({ lines: [], steps: [] });
	const long = rodLengthMm(over, bigMandrel, smallMandrel);
	if (!long.ok) return long;
	const mm = { value: long.value, unit: 'mm', decimals: 2 };
	return computed({
		lengthMm: long.value,
		lines: [{ key: 'length', words: 'Centre to centre', ...mm }],
		steps: [
			{
				words: 'Centre to centre: over both mandrels less half of each',
				rule: 'L = H − (D + d) / 2',
				formula: `${plain(over)} − (${plain(bigMandrel)} + ${plain(smallMandrel)}) / 2`,
				...mm
			}
		]
	});
}

function sideWords(per100Mm: number): string {
	return per100Mm === 0 ? '' : per100Mm > 0 ? ', far side high' : ', near side high';
}
