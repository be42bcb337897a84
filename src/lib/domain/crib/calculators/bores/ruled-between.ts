import { ruleReading, type Limits, type RulingQuestion } from '$lib/kernel/measurement/ruling';
import { computed, type Outcome } from '$lib/kernel/outcome';
import type { RuledReading } from '../../worked';

/** A result with its expanded uncertainty, and the limits that each question holds it to. */
export type Held = {
	of: string;
	valueMm: number;
	/** Without it nothing is ruled. */
	expandedMm: number | undefined;
} & { [Q in RulingQuestion]?: Limits };

/** Limits as they were typed: what was left empty is no limit. */
export function limitsOf(least: number | undefined, most: number | undefined): Limits {
	return {
		...(least === undefined ? {} : { least }),
		...(most === undefined ? {} : { most })
	};
}

/** Rules each result by each question that has a limit. */
export function ruledBetween(results: readonly Held[]): Outcome<RuledReading[]> {
	const rulings: RuledReading[] = [];
	for (const { of, valueMm: value, expandedMm, ...questions } of results) {
		if (expandedMm === undefined) continue;
		for (const question of ['build', 'run-again'] as const) {
			const limits = questions[question];
			if (limits?.least === undefined && limits?.most === undefined) continue;
			const ruling = ruleReading({ question, value, expandedUncertainty: expandedMm, ...limits });
			if (!ruling.ok) return ruling;
			rulings.push({
				of,
				question,
				value,
				expandedUncertainty: expandedMm,
				unit: 'mm',
				decimals: 3,
				...limits,
				ruling: ruling.value
			});
		}
	}
	return computed(rulings);
}
