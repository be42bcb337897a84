import {
	balanceRules,
	type Balance,
	type BalanceRule
} from '$lib/kernel/cylinder/compression-test';
import type { CompressionReading, CylinderVerdict } from '$lib/kernel/cylinder/compression-verdict';
import { convert } from '$lib/kernel/quantity/units';
import type { Step } from '../../../working';
import { figure, plain } from '../formula-figures';

const bar = { unit: 'bar', decimals: 2 } as const;
const inBar = (psi: number) => figure(convert('pressure', psi, 'psi', 'bar'), 2);

/** The least allowed of a set, and the engine's own where it is the higher one. */
export function balanceSteps(
	dryBar: readonly number[],
	rule: BalanceRule,
	{ ruleBar, allowedBar }: Balance,
	leastBar: number | undefined
): Step[] {
	const highest = figure(Math.max(...dryBar), 2);
	const written: Record<BalanceRule, [rule: string, formula: string]> = {
		'75-of-highest': ['0.75 · highest', `0.75 · ${highest}`],
		'70-of-highest': [
			'0.70 · highest, 100 psi at least',
			`the higher of 0.70 · ${highest} and ${inBar(100)}`
		],
		'80-of-mean': [
			'0.80 · mean',
			`0.80 · (${dryBar.map((one) => figure(one, 2)).join(' + ')}) / ${dryBar.length}`
		],
		'10-psi-apart': ['highest − 10 psi', `${highest} − ${inBar(10)}`],
		'100-psi-apart': ['highest − 100 psi', `${highest} − ${inBar(100)}`]
	};
	const [letters, formula] = written[rule];
	return [
		{ words: `Rule: ${balanceRules[rule].words}`, rule: letters, formula, value: ruleBar, ...bar },
		...(leastBar === undefined
			? []
			: [
					{
						words: 'Least allowed: the rule’s or the engine’s own, whichever is higher',
						rule: 'the higher of the two',
						formula: `${figure(ruleBar, 2)} or ${plain(leastBar)}`,
						value: allowedBar,
						...bar
					}
				])
	];
}

export function risesIn(
	readings: readonly CompressionReading[],
	cylinders: readonly CylinderVerdict[]
): Step[] {
	return cylinders.flatMap(({ cylinder, wet }) => {
		const read = readings[cylinder - 1];
		if (!wet || read?.wetBar === undefined) return [];
		return [
			{
				words: `Rise of cylinder ${cylinder} with oil`,
				rule: 'rise = 100 % · (wet − dry) / dry',
				formula: `100 · (${figure(read.wetBar, 2)} − ${figure(read.dryBar, 2)}) / ${figure(read.dryBar, 2)}`,
				value: wet.rise * 100,
				unit: '%',
				decimals: 0
			}
		];
	});
}
