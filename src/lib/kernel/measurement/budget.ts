import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import { combinedStandard } from './combined';
import type { Component } from './component';
import { coverageFactor95, effectiveDegrees } from './effective-degrees';
import { coverageFactor } from './uncertainty';

export type BudgetLine = Component & {
	/** |c| · u, in the result's unit. */
	contribution: number;
	/** Part of the result's variance, 0 to 1. */
	share: number;
};
export type Budget = {
	lines: BudgetLine[];
	standard: number;
	degreesOfFreedom: number;
	coverageFactor: number;
	expanded: number;
};

/**
 * An uncertainty budget: what each input adds, and the expanded uncertainty for about 95 %.
 *
 * Formula: U = k · u; k = t with 97.5 % below for ⌊ν⌋ degrees of freedom, never less than 2.
 * @param components independent ones, the order is kept
 * @returns lines with contribution and share, u, ν, k and U; "cannot" where a figure is none,
 * nothing is uncertain, or there is less than one degree of freedom
 * Source: JCGM 100:2008 (GUM), 6.2.1, G.4.1 (ν cut to a whole number) and 6.3.3; the floor of 2
 * keeps a budget of known parts in step with every other U of this house.
 * @example uncertaintyBudget([{ name: 'least count', type: 'B', standard: 0.0029, sensitivity: 1,
 *   degreesOfFreedom: Infinity }]) // U = 0.0058
 */
export function uncertaintyBudget(components: readonly Component[]): Outcome<Budget> {
	const standard = combinedStandard(components);
	if (!standard.ok) return standard;
	const degrees = effectiveDegrees(components);
	if (!degrees.ok) return degrees;
	if (degrees.value < 1) return cannot('there are too few readings to know their scatter');
	const k = Math.max(coverageFactor, coverageFactor95(Math.floor(degrees.value)));
	const expanded = computedNumber(k * standard.value);
	if (!expanded.ok) return expanded;
	return computed({
		lines: components.map((one) => {
			const contribution = Math.abs(one.sensitivity) * one.standard;
			return { ...one, contribution, share: (contribution / standard.value) ** 2 };
		}),
		standard: standard.value,
		degreesOfFreedom: degrees.value,
		coverageFactor: k,
		expanded: expanded.value
	});
}
