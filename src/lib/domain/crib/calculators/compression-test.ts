import { balanceRules, type BalanceRule } from '$lib/kernel/cylinder/compression-test';
import {
	compressionVerdicts,
	type CylinderVerdict
} from '$lib/kernel/cylinder/compression-verdict';
import { computed } from '$lib/kernel/outcome';
import { dimensionOf } from '../../data-sheets/value-of';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { choice, quantity, table } from '../field';
import type { ResultLine } from '../worked';
import { balanceSteps, risesIn } from './cylinder/balance-steps';
import { pressure, stated } from './cylinder/faces';

const options = (Object.keys(balanceRules) as BalanceRule[]).map((value) => ({
	value,
	words: balanceRules[value].words
}));

/** A set of compression readings judged against each other by a published rule. */
export const compressionTest = calculator({
	key: 'compression-test',
	title: 'Compression test',
	says: 'Which cylinders of a set are low by a published rule, which neighbours are low together, and what a spoonful of oil says of them.',
	drawer: 'cylinder',
	caution:
		'Ignition disabled, fuel shut off, throttle open, all plugs out, hands clear of the belts. Never put oil into a diesel or near a glow plug for this: what fits above its piston is little more than a spoonful.',
	formulas: ['cylinder/compression-balance', 'cylinder/wet-test'],
	sources: [
		...Object.values(balanceRules).map((one) => `${one.words}: ${one.source}.`),
		'At least five compression strokes each, or until the gauge stops rising; the same number for all: US Army TM 5-4210-230-14&P addendum 2, steps 1 to 6.'
	],
	fields: {
		readings: table({
			...pressure,
			words: 'Highest reading of each cylinder',
			hint: 'The same number of strokes for each. Wet: again after about a tablespoon of oil.',
			row: 'Cylinder',
			columns: [
				{ key: 'dry', words: 'Dry', of: 'quantity' },
				{ key: 'wet', words: 'Wet', of: 'quantity', optional: true }
			],
			rows: { from: 4, least: 2, most: 16 },
			example: '10.3_*10.0_*10.2_*7.4_9.5'
		}),
		rule: choice({ words: 'Rule', options, example: '75-of-highest', initial: '75-of-highest' }),
		least: quantity({
			...pressure,
			words: 'Least that the engine’s data sheet allows',
			decimals: 1,
			least: 0,
			most: 100,
			optional: true,
			example: '8.5'
		})
	},
	work({ readings, rule, least }) {
		const typed = readings.map(({ dry, wet }) => ({
			dryBar: Number(dry),
			...(typeof wet === 'number' ? { wetBar: wet } : {})
		}));
		const found = compressionVerdicts(typed, rule, least);
		if (!found.ok) return found;
		const { balance, cylinders } = found.value;
		const { low, allowedBar, lowestShare } = balance;
		const bar = { unit: 'bar', decimals: 2 };
		const lines: ResultLine[] = [
			{
				key: 'low',
				words: 'Low',
				text: low.length === 0 ? 'none' : `cylinder ${low.join(', ')}`,
				main: true
			},
			{ key: 'allowed', words: 'Least allowed in this set', value: allowedBar, ...bar, main: true },
			{
				key: 'share',
				words: 'Lowest, of the highest',
				value: lowestShare * 100,
				unit: '%',
				decimals: 0
			},
			...cylinders.flatMap(verdictLine)
		];
		const working: Step[] = [
			...balanceSteps(
				typed.map((one) => one.dryBar),
				rule,
				balance,
				least
			),
			...risesIn(typed, cylinders)
		];
		return computed({
			lines,
			working,
			drawing: {
				kind: 'cylinder-bars',
				unit: 'bar',
				decimals: 1,
				bars: typed.map(({ dryBar, wetBar }, at) => ({
					words: String(at + 1),
					value: dryBar,
					marked: low.includes(at + 1),
					...(wetBar === undefined ? {} : { second: wetBar })
				})),
				secondWords: 'with oil',
				line: allowedBar,
				lineWords: 'least allowed'
			}
		});
	},
	presets: (sheet) => {
		const found = dimensionOf(sheet, 'cylinder.compressionPressure');
		const least = found?.runAgain?.least ?? found?.build?.least;
		if (!found || least === undefined) return [];
		const rule =
			sheet.layout?.ignition === 'compression'
				? ('100-psi-apart' satisfies BalanceRule)
				: undefined;
		return [{ key: found.key, words: found.words, values: stated({ least: String(least), rule }) }];
	}
});

/** What follows for a cylinder; nothing where nothing does. */
function verdictLine({ cylinder, share, wet, next }: CylinderVerdict): ResultLine[] {
	if (!next && !wet) return [];
	const rise = wet
		? `, ${wet.rise < 0 ? '−' : '+'}${Math.abs(wet.rise * 100).toFixed(0)} % with oil`
		: '';
	return [
		{
			key: `cylinder-${cylinder}`,
			words: `Cylinder ${cylinder}: ${(share * 100).toFixed(0)} % of the highest${rise}`,
			text: next ?? 'within: nothing follows.'
		}
	];
}
