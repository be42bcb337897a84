import {
	aroundTheTurn,
	eccentricityMm,
	type AroundTheTurn,
	type AtAngle
} from '$lib/kernel/geometry/runout';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { choice, quantity, table, type TableRow } from '../field';
import { bracketed, figure } from './formula-figures';
import { ruledAgainst } from './ruled-against';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const limit = { ...length, decimals: 3, least: 0, most: 10, optional: true } as const;
const mm = { unit: 'mm', decimals: 3 };
const supports = {
	centres: 'Turned between centres, the journals’ own shape does not come into it.',
	vee: 'On vee blocks the shape of the journals in them comes into every reading: a section can seem to run out that does not, or the other way round. Measure these journals for out-of-round first, or turn the shaft between centres.',
	bearings:
		'In its own bearings the shaft lifts by their clearance. Oil them, lay the shaft without load and turn it slowly by hand.'
};

/** Runout around a turn, and how much of it is bend and how much out-of-round. */
export const runout = calculator({
	key: 'runout',
	title: 'Runout around a turn',
	says: 'The runout of a shaft, a flange or a seat from a dial around one turn, and how much of it is a middle off its axis and how much a section out of round.',
	drawer: 'faces',
	caution:
		'Turn by hand, with fingers clear of counterweights and blocks. Runout is the full travel of the dial, bend is half of it: look which of the two a limit means.',
	formulas: [
		'geometry/runout',
		'geometry/eccentricity',
		'geometry/around-the-turn',
		'geometry/of-weighted-readings',
		'measurement/ruling'
	],
	fields: {
		readings: table({
			...length,
			words: 'Readings around the turn',
			hint: 'At least four; eight show more. Leave every angle empty where they lie evenly.',
			row: 'Reading',
			columns: [
				{ key: 'angle', words: 'Angle, °', of: 'number', optional: true },
				{ key: 'read', words: 'Dial', of: 'quantity' }
			],
			rows: { from: 8, least: 4, most: 36 },
			example: '0_0.000*45_0.012*90_0.029*135_0.036*180_0.033*225_0.021*270_0.004*315_-0.004'
		}),
		support: choice({
			words: 'What it turns in',
			options: [
				{ value: 'centres', words: 'Between centres' },
				{ value: 'vee', words: 'Vee blocks' },
				{ value: 'bearings', words: 'Its own bearings' }
			],
			example: 'vee'
		}),
		buildMost: quantity({ ...limit, words: 'Most runout, to build', example: '0.03' }),
		runMost: quantity({ ...limit, words: 'Most runout, to run again', example: '0.05' }),
		uncertainty: quantity({
			...limit,
			words: 'Expanded uncertainty of one reading',
			hint: 'With it and a limit the runout is ruled.',
			example: '0.003'
		})
	},
	work({ readings, support, buildMost, runMost, uncertainty }) {
		const given = turnOf(readings);
		if (!given.ok) return given;
		const { at, evenly } = given.value;
		const turn = aroundTheTurn(at);
		if (!turn.ok) return turn;
		const half = eccentricityMm(turn.value.runoutMm);
		if (!half.ok) return half;
		const { runoutMm, eccentricityMm: off, highAtDeg, outOfRoundMm, meanMm } = turn.value;
		const rulings = ruledAgainst(
			[
				{
					of: 'Runout',
					valueMm: runoutMm,
					weights: [1, -1],
					build: buildMost,
					'run-again': runMost
				}
			],
			uncertainty
		);
		if (!rulings.ok) return rulings;
		return computed({
			lines: [
				{
					key: 'runout',
					words: 'Runout, full travel of the dial',
					value: runoutMm,
					...mm,
					main: true
				},
				{
					key: 'half',
					words: 'Half of it, as bend is stated',
					value: half.value,
					...mm,
					main: true
				},
				{ key: 'eccentricity', words: 'Middle off its axis, fitted', value: off, ...mm },
				{ key: 'high', words: 'Its high side towards', value: highAtDeg, unit: '°', decimals: 0 },
				{ key: 'out-of-round', words: 'Left over: out of round', value: outOfRoundMm, ...mm }
			],
			working: [...steps(at, turn.value, half.value, evenly), ...rulings.value.steps],
			rulings: rulings.value.rulings,
			notes: [
				supports[support],
				...(at.length < 8
					? [
							'So few readings hardly tell out-of-round from a middle off its axis: take eight or more.'
						]
					: [])
			],
			drawing: {
				kind: 'turn',
				readings: at,
				meanMm,
				eccentricityMm: off,
				highAtDeg,
				runoutMm,
				outOfRoundMm
			}
		});
	},
	presets: (sheet) =>
		sheet.dimensions
			.filter((one) => one.unit === 'mm' && /runout$/i.test(one.key))
			.map(({ key, words, build, runAgain }) => ({
				key,
				words,
				values: {
					...(build ? { buildMost: String(build.most) } : {}),
					...(runAgain?.most === undefined ? {} : { runMost: String(runAgain.most) })
				}
			}))
});

/** Readings with their angles; evenly spread where none is given. */
function turnOf(rows: readonly TableRow[]): Outcome<{ at: AtAngle[]; evenly: boolean }> {
	const angles = rows.map((row) => row.angle);
	const none = angles.every((one) => one === null);
	const missing = angles.findIndex((one) => typeof one !== 'number');
	if (!none && missing >= 0)
		return cannot(`reading ${missing + 1} has no angle: give every angle, or none`);
	const at = rows.map(({ angle, read }, one) => ({
		angleDeg: typeof angle === 'number' ? angle : (one * 360) / rows.length,
		readMm: typeof read === 'number' ? read : 0
	}));
	const [first] = at;
	return computed({
		at,
		evenly: at.every(
			({ angleDeg }, one) =>
				Math.abs(angleDeg - (first?.angleDeg ?? 0) - (one * 360) / at.length) < 1e-6
		)
	});
}

function steps(at: readonly AtAngle[], turn: AroundTheTurn, half: number, evenly: boolean): Step[] {
	const reads = at.map((one) => one.readMm);
	const travel = (these: readonly number[]) =>
		`${figure(Math.max(...these))} − ${bracketed(Math.min(...these))}`;
	return [
		{
			words: 'Runout: largest reading less smallest',
			rule: 'TIR = largest − smallest',
			formula: travel(reads),
			value: turn.runoutMm,
			...mm
		},
		{
			words: 'Half of it',
			rule: 'e = TIR / 2',
			formula: `${figure(turn.runoutMm)} / 2`,
			value: half,
			...mm
		},
		{
			words: `What rises and falls once a turn, towards 0°${evenly ? '' : ', by least squares over these angles'}`,
			...(evenly
				? { rule: 'a = (2 / n) · Σ reading · cos θ', formula: sum(at, Math.cos, 'cos') }
				: { rule: 'a' }),
			value: turn.cosMm,
			unit: 'mm',
			decimals: 4
		},
		{
			words: 'The same towards 90°',
			...(evenly
				? { rule: 'b = (2 / n) · Σ reading · sin θ', formula: sum(at, Math.sin, 'sin') }
				: { rule: 'b' }),
			value: turn.sinMm,
			unit: 'mm',
			decimals: 4
		},
		{
			words: `Middle off its axis, towards ${turn.highAtDeg.toFixed(0)}°`,
			rule: 'e = √(a² + b²)',
			formula: `√(${bracketed(turn.cosMm, 4)}² + ${bracketed(turn.sinMm, 4)}²)`,
			value: turn.eccentricityMm,
			...mm
		},
		{
			words:
				'Out of round: each reading less m + a · cos θ + b · sin θ, largest of what is left less smallest',
			rule: 'largest rest − smallest rest',
			formula: travel(turn.restMm),
			value: turn.outOfRoundMm,
			...mm
		}
	];
}

function sum(at: readonly AtAngle[], wave: (radians: number) => number, name: string): string {
	const terms = at
		.filter((one) => Math.abs(wave((one.angleDeg * Math.PI) / 180)) > 1e-9 && one.readMm !== 0)
		.map((one) => `${bracketed(one.readMm)} · ${name} ${Number(one.angleDeg.toFixed(1))}°`);
	return `(2 / ${at.length}) · (${terms.join(' + ') || '0'})`;
}
