import { cannot, computed, type Outcome } from '../outcome';
import { guardBandOf, guardBandRules, type GuardBandRule } from './guard-band';

export type RulingQuestion = 'build' | 'run-again';
export type RulingName = 'within' | 'out' | 'too-close';
export type Ruling = {
	ruling: RulingName;
	rule: GuardBandRule;
	/** How far inside a limit a value must lie to be called within, and outside to be called out. */
	guardBand: number;
	because: string;
	next: string;
};
export type Limits = { least?: number; most?: number };

/**
 * Rules a measured value against its limits, with a guard band on both sides of each: within is
 * proven within, out is proven out, and between them nobody can tell.
 *
 * Formula: within when least + g ≤ value ≤ most − g; out when value < least − g or
 * value > most + g; otherwise too close to call.
 * @param asked value, expanded uncertainty (k = 2) and limits in one unit; the rule for g, by
 * default the full U
 * @returns the ruling with its rule, reason and what to do next
 * Source: ISO 14253-1 (proving conformity and non-conformity), as in its editions up to 2013 with
 * g = U; its default of 2017, 95 % probability, is met by g = 1.645 u ("one-sided-95"). The wider
 * band is the house's rule: it is the one that workshops know, and it errs towards measuring again.
 * @example ruleReading({ question: 'run-again', value: 0.068, expandedUncertainty: 0.005,
 *   most: 0.07 }) // too close to call
 */
export function ruleReading(
	asked: {
		question: RulingQuestion;
		value: number;
		expandedUncertainty: number;
		rule?: GuardBandRule;
	} & Limits
): Outcome<Ruling> {
	const { question, value, expandedUncertainty, rule = 'full-U', least, most } = asked;
	if (least === undefined && most === undefined) return cannot('there is no limit to rule by');
	if (least !== undefined && most !== undefined && most < least)
		return cannot('the least limit lies above the most');
	if (![least ?? 0, most ?? 0].every(Number.isFinite)) return cannot('a limit is no number');
	if (![value, expandedUncertainty].every(Number.isFinite) || expandedUncertainty < 0)
		return cannot('the reading or its uncertainty is no number');
	const guardBand = guardBandOf(rule, expandedUncertainty);
	const { words } = guardBandRules[rule];
	const under = least === undefined ? -Infinity : least - value;
	const over = most === undefined ? -Infinity : value - most;
	const beyond = Math.max(under, over);
	// A nanometre's worth of binary dust must not decide.
	const dust = 1e-9;
	if (beyond > guardBand + dust)
		return computed({
			ruling: 'out',
			rule,
			guardBand,
			because: `It lies ${under > over ? 'below the least' : 'above the most'} by more than ${words}.`,
			next: nextWhenOut[question]
		});
	if (beyond <= -guardBand + dust)
		return computed({
			ruling: 'within',
			rule,
			guardBand,
			because: `It lies inside its limits by at least ${words}.`,
			next: question === 'build' ? 'Fit to build.' : 'It may run again.'
		});
	return computed({
		ruling: 'too-close',
		rule,
		guardBand,
		because: `It lies closer to a limit than ${words}.`,
		next: 'Fetch a finer instrument, or have a second person measure; do not decide on this reading.'
	});
}

const nextWhenOut: Record<RulingQuestion, string> = {
	build: 'Not fit for a fresh build: choose another part, or machine to the next size.',
	'run-again': 'It cannot run again as it is: replace it, or machine to the next size.'
};
