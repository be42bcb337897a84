import { suspectAbovePercent } from '$lib/kernel/cylinder/leak-down';
import {
	airWay,
	leakVerdict,
	printedLeakLimits,
	whereAirComesOut,
	type AirWay,
	type LeakVerdict
} from '$lib/kernel/cylinder/leak-ways';
import { pistonForceN } from '$lib/kernel/cylinder/speed-and-power';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { convert } from '$lib/kernel/quantity/units';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { quantity, table, type TableRow } from '../field';
import type { ResultLine } from '../worked';
import { boreRange, length, middleOf, pressure } from './cylinder/faces';
import { figure, plain } from './formula-figures';

type Tested = { cylinder: number; heldBar: number; way?: AirWay };
const ways = Object.values(whereAirComesOut);

/** Leakage of each cylinder under air at top dead centre. */
export const leakDown = calculator({
	key: 'leak-down',
	title: 'Leak-down test',
	says: 'How much each cylinder leaks under air at top dead centre, what the trade calls it, and which part the sound of it points to.',
	drawer: 'cylinder',
	caution:
		'Off top dead centre the test air can spin the crankshaft suddenly: keep hands, tools and bars clear, and let the air in slowly.',
	formulas: ['cylinder/leak', 'cylinder/leak-band', 'cylinder/piston-force'],
	sources: [
		`Where it is heard: ${ways.map((one) => `${one.at}, ${one.says}`).join('; ')}.`,
		`One maker’s limits at about 5 bar: ${printedLeakLimits['valves-and-gasket']} % through valves and gasket, ${printedLeakLimits['piston-and-rings']} % past piston and rings, ${printedLeakLimits.total} % in all (maker not named).`,
		'Percentages of two testers with different orifices are not to be compared: FAA AC 43.13-1B change 1, para 8-14.'
	],
	fields: {
		input: quantity({
			...pressure,
			words: 'Regulator’s gauge',
			decimals: 2,
			least: 0.1,
			most: 20,
			example: '5.5'
		}),
		held: table({
			...pressure,
			words: 'Cylinder’s gauge',
			hint: `Heard at: ${Object.keys(whereAirComesOut).join(', ')}; left empty where nobody listened.`,
			row: 'Cylinder',
			columns: [
				{ key: 'held', words: 'Held', of: 'quantity' },
				{ key: 'way', words: 'Heard at', of: 'text', optional: true }
			],
			rows: { from: 4, least: 1, most: 16 },
			example: '5.1_*4.9_breather*3.9_exhaust*5.0_'
		}),
		bore: quantity({
			...length,
			...boreRange,
			words: 'Bore',
			hint: 'With it, the force of the test air on a piston.',
			optional: true,
			example: '74'
		})
	},
	work({ input, held, bore }) {
		const tested = testedIn(held);
		if (!tested.ok) return tested;
		const verdicts: (Tested & LeakVerdict)[] = [];
		for (const one of tested.value) {
			const verdict = leakVerdict(input, one.heldBar, one.way);
			if (!verdict.ok) return cannot(`cylinder ${one.cylinder}: ${verdict.because}`);
			verdicts.push({ ...one, ...verdict.value });
		}
		const force =
			bore === undefined ? undefined : pistonForceN(convert('pressure', input, 'bar', 'MPa'), bore);
		if (force && !force.ok) return force;
		const newton = { unit: 'N', decimals: 0 };
		const lines: ResultLine[] = [
			...verdicts.flatMap(leakLines),
			...(force
				? [
						{
							key: 'force',
							words: 'The air pushes on a piston with',
							value: force.value,
							...newton
						}
					]
				: [])
		];
		const working: Step[] = [
			...verdicts.map(({ cylinder, heldBar, percent }) => ({
				words: `Cylinder ${cylinder}`,
				rule: 'leak = 100 % · (p − c) / p',
				formula: `100 · (${figure(input, 2)} − ${figure(heldBar, 2)}) / ${figure(input, 2)}`,
				value: percent,
				unit: '%',
				decimals: 1
			})),
			...(force && bore !== undefined
				? [
						{
							words: 'Force on a piston: 1 bar is 0.1 N on each mm²',
							rule: 'F = p · π/4 · B²',
							formula: `${figure(input, 2)} · 0.1 · π/4 · ${plain(bore)}²`,
							value: force.value,
							...newton
						}
					]
				: [])
		];
		return computed({
			lines,
			working,
			notes: verdicts.every((one) => one.way)
				? []
				: [
						`Listen while the air is on: ${ways.map((one) => `${one.at}, ${one.says}`).join('; ')}.`
					],
			drawing: {
				kind: 'cylinder-bars',
				unit: '%',
				decimals: 1,
				bars: verdicts.map(({ cylinder, percent, suspect }) => ({
					words: String(cylinder),
					value: percent,
					marked: suspect
				})),
				line: suspectAbovePercent,
				lineWords: 'looked into above'
			}
		});
	},
	presets: (sheet) => {
		const bore = middleOf(sheet, 'cylinder.bore');
		return bore ? [{ key: 'cylinder.bore', words: 'Bore', values: { bore } }] : [];
	}
});

function testedIn(rows: readonly TableRow[]): Outcome<Tested[]> {
	const tested: Tested[] = [];
	for (const [at, row] of rows.entries()) {
		const cylinder = at + 1;
		const heard = typeof row.way === 'string' ? row.way : '';
		const way = heard === '' ? undefined : airWay(heard);
		if (way && !way.ok) return cannot(`cylinder ${cylinder}: ${way.because}`);
		tested.push({ cylinder, heldBar: Number(row.held), ...(way ? { way: way.value } : {}) });
	}
	return computed(tested);
}

function leakLines({ cylinder, percent, band, way, printed, next }: Tested & LeakVerdict) {
	const heard = way ? `, ${whereAirComesOut[way].says}` : '';
	const limit = printed?.passed ? ` One maker would allow ${printed.limit} % by this way.` : '';
	const follows = `${next ?? ''}${limit}`.trim();
	const lines: ResultLine[] = [
		{
			key: `leak-${cylinder}`,
			words: `Cylinder ${cylinder}: ${band}${heard}`,
			value: percent,
			unit: '%',
			decimals: 1,
			main: true
		}
	];
	if (follows)
		lines.push({ key: `next-${cylinder}`, words: `Cylinder ${cylinder}, next`, text: follows });
	return lines;
}
