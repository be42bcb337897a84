import {
	balanceRules,
	compressionBalance,
	wetTest,
	type BalanceRule
} from '$lib/kernel/cylinder/compression-test';
import { computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { choice, table } from '../field';
import type { ResultLine } from '../worked';
import { figure } from './formula-figures';

const verdicts = {
	rings: 'a clear rise: rings, piston or bore',
	'valves-or-gasket': 'no rise: valves or head gasket',
	unclear: 'a little: neither is shown'
};
const options = Object.entries(balanceRules).map(([value, one]) => ({
	value: value as BalanceRule,
	words: one.words
}));

/** A set of compression readings judged against each other by a published rule. */
export const compressionTest = calculator({
	key: 'compression-test',
	title: 'Compression test',
	says: 'Which cylinders of a set are low by a published rule, which neighbours are low together, and what a spoonful of oil says of them.',
	drawer: 'cylinder',
	caution:
		'Ignition disabled, fuel shut off, throttle open, all plugs out, hands clear of the belts. A maker’s own limits win over every rule here.',
	formulas: ['cylinder/compression-balance', 'cylinder/wet-test'],
	sources: Object.values(balanceRules).map((one) => `${one.words}: ${one.source}`),
	fields: {
		readings: table({
			dimension: 'pressure',
			unit: { metric: 'bar', inch: 'psi' },
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
		rule: choice({ words: 'Rule', options, example: '75-of-highest', initial: '75-of-highest' })
	},
	work({ readings, rule }) {
		const dry = readings.map((row) => Number(row.dry));
		const found = compressionBalance(dry, rule);
		if (!found.ok) return found;
		const { allowedBar, lowestShare, low, neighbours } = found.value;
		const bar = { unit: 'bar', decimals: 1 };
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
				words: 'Lowest of the highest',
				value: lowestShare * 100,
				unit: '%',
				decimals: 0
			}
		];
		for (const [at, row] of readings.entries()) {
			if (typeof row.wet !== 'number' || typeof row.dry !== 'number') continue;
			const wet = wetTest(row.dry, row.wet);
			if (!wet.ok) return wet;
			lines.push({
				key: `wet-${at}`,
				words: `Cylinder ${at + 1} with oil, +${(wet.value.rise * 100).toFixed(0)} %`,
				text: verdicts[wet.value.verdict]
			});
		}
		return computed({
			lines,
			working: [
				{
					words: balanceRules[rule].words,
					rule: ruleLetters[rule],
					formula: ruleFigures(rule, dry),
					value: allowedBar,
					unit: 'bar',
					decimals: 2
				}
			],
			notes: neighbours.map(
				([a, b]) =>
					`Cylinders ${a} and ${b} are low side by side: look at the gasket between them first.`
			),
			drawing: {
				kind: 'cylinder-bars',
				unit: 'bar',
				bars: dry.map((value, at) => ({ words: String(at + 1), value, low: low.includes(at + 1) })),
				line: allowedBar,
				lineWords: 'least allowed'
			}
		});
	}
});

const ruleLetters: Record<BalanceRule, string> = {
	'75-of-highest': '0.75 · highest',
	'70-of-highest': '0.70 · highest',
	'80-of-mean': '0.80 · mean',
	'10-psi-apart': 'highest − 0.69 bar',
	'100-psi-apart': 'highest − 6.9 bar'
};

function ruleFigures(rule: BalanceRule, dry: number[]): string {
	const highest = figure(Math.max(...dry), 2);
	if (rule === '80-of-mean')
		return `0.80 · (${dry.map((one) => figure(one, 2)).join(' + ')}) / ${dry.length}`;
	if (rule === '75-of-highest') return `0.75 · ${highest}`;
	if (rule === '70-of-highest') return `0.70 · ${highest}`;
	return rule === '10-psi-apart' ? `${highest} − 0.69` : `${highest} − 6.89`;
}
