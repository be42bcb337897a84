import { ofWeightedReadingsMm } from '$lib/kernel/geometry/weighted-readings';
import { ruleReading, type RulingQuestion } from '$lib/kernel/measurement/ruling';
import { computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import type { RuledReading } from '../worked';
import { figure, plain } from './formula-figures';

/** A result that some readings of one uncertainty went into, and the most that each question allows. */
export type Judged = {
	of: string;
	valueMm: number;
	weights: readonly number[];
} & { [Q in RulingQuestion]?: number | undefined };

/** Rules each result against each limit given, by the uncertainty of the readings in it. */
export function ruledAgainst(
	results: readonly Judged[],
	readingMm: number | undefined
): Outcome<{ rulings: RuledReading[]; steps: Step[] }> {
	const rulings: RuledReading[] = [];
	const steps: Step[] = [];
	if (readingMm === undefined) return computed({ rulings, steps });
	for (const result of results) {
		const { of, valueMm: value, weights } = result;
		const expanded = ofWeightedReadingsMm(weights, readingMm);
		if (!expanded.ok) return expanded;
		for (const question of ['build', 'run-again'] as const) {
			const most = result[question];
			if (most === undefined) continue;
			const expandedUncertainty = expanded.value;
			const ruling = ruleReading({ question, value, expandedUncertainty, most });
			if (!ruling.ok) return ruling;
			rulings.push({
				of,
				question,
				value,
				expandedUncertainty,
				unit: 'mm',
				decimals: 3,
				most,
				ruling: ruling.value
			});
		}
		if (rulings.some((one) => one.of === of))
			steps.push({
				words: `${of}: uncertainty from that of one reading`,
				rule: 'U = U1 · √(Σ weight²)',
				formula: `${plain(readingMm)} · √(${weights.map((one) => `${figure(Math.abs(one), 4)}²`).join(' + ')})`,
				value: expanded.value,
				unit: 'mm',
				decimals: 4
			});
	}
	return computed({ rulings, steps });
}
