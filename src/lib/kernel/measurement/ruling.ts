import { cannot, computed, type Outcome } from '../outcome';

export type RulingQuestion = 'build' | 'run-again';
export type RulingName = 'within' | 'out' | 'too-close';
export type Ruling = {
	ruling: RulingName;
	/** How far inside a limit a value must lie to be called within, and outside to be called out. */
	guardBand: number;
	because: string;
	next: string;
};
export type Limits = { least?: number; most?: number };

/**
 * Rules a measured value against its limits, with the full expanded uncertainty as guard band on
 * both sides: within is proven within, out is proven out, and between them nobody can tell.
 *
 * Formula: within when least + U ≤ value ≤ most − U; out when value < least − U or
 * value > most + U; otherwise too close to call.
 * @param asked value, expanded uncertainty (k = 2) and limits in one unit
 * @returns the ruling with its reason and what to do next
 * Source: ISO 14253-1 (proving conformity and non-conformity) with guard band g = U, as in its
 * editions up to 2013; the default of 2017, 95 % probability, would be satisfied with g = 1.65 u.
 * The wider band is kept: it is the one that workshops know, and it errs towards measuring again.
 * @example ruleReading({ question: 'run-again', value: 0.068, expandedUncertainty: 0.005,
 *   most: 0.07 }) // too close to call
 */
export function ruleReading(
	asked: { question: RulingQuestion; value: number; expandedUncertainty: number } & Limits
): Outcome<Ruling> {
	const { question, value, expandedUncertainty: guardBand, least, most } = asked;
	if (least === undefined && most === undefined) return cannot('there is no limit to rule by');
	if (least !== undefined && most !== undefined && most < least)
		return cannot('the least limit lies above the most');
	if (![least ?? 0, most ?? 0].every(Number.isFinite)) return cannot('a limit is no number');
	if (![value, guardBand].every(Number.isFinite) || guardBand < 0)
		return cannot('the reading or its uncertainty is no number');
	const under = least === undefined ? -Infinity : least - value;
	const over = most === undefined ? -Infinity : value - most;
	const beyond = Math.max(under, over);
	// A nanometre's worth of binary dust must not decide.
	const dust = 1e-9;
	if (beyond > guardBand + dust)
		return computed({
			ruling: 'out',
			guardBand,
			because: `It lies ${under > over ? 'below the least' : 'above the most'} by more than its uncertainty.`,
			next: nextWhenOut[question]
		});
	if (beyond <= -guardBand + dust)
		return computed({
			ruling: 'within',
			guardBand,
			because: 'It lies inside its limits by at least its uncertainty.',
			next: question === 'build' ? 'Fit to build.' : 'It may run again.'
		});
	return computed({
		ruling: 'too-close',
		guardBand,
		because: 'It lies closer to a limit than its uncertainty.',
		next: 'Fetch a finer instrument, or have a second person measure; do not decide on this reading.'
	});
}

const nextWhenOut: Record<RulingQuestion, string> = {
	build: 'Not fit for a fresh build: choose another part, or machine to the next size.',
	'run-again': 'It cannot run again as it is: replace it, or machine to the next size.'
};
