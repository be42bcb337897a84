import { cannot, computed, type Outcome } from '../outcome';
import { normalCdf } from '../statistics/distributions/normal';
import { ruleReading, type Limits, type Ruling } from './ruling';
import { coverageFactor } from './uncertainty';

/**
 * Probability that the part lies within its limits, given what was read.
 *
 * Formula: p = Φ((most − y) / u) − Φ((least − y) / u); a missing limit leaves its term out.
 * @param asked value y, its standard uncertainty u (zero: known exactly) and one or two limits, in
 * one unit
 * @returns 0 to 1; "cannot" without a limit, or where a figure is none
 * Source: JCGM 106:2012, 7.3 and 7.4, nothing else being known of the part.
 * @example conformanceProbability({ value: 13.6, standardUncertainty: 1.8, least: 12.5,
 *   most: 16.3 }) // 0.6626
 */
export function conformanceProbability(
	asked: { value: number; standardUncertainty: number } & Limits
): Outcome<number> {
	const { value, standardUncertainty: u, least = -Infinity, most = Infinity } = asked;
	if (least === -Infinity && most === Infinity) return cannot('there is no limit to rule by');
	if (Number.isNaN(least) || Number.isNaN(most) || least === Infinity || most === -Infinity)
		return cannot('a limit is no number');
	if (most < least) return cannot('the least limit lies above the most');
	if (!Number.isFinite(value) || !(u >= 0) || !Number.isFinite(u))
		return cannot('the reading or its uncertainty is no number');
	if (u === 0) return computed(value >= least && value <= most ? 1 : 0);
	// Taken from the side where the probabilities are small, since there they have all figures.
	const [low, high] = [(least - value) / u, (most - value) / u];
	return computed(
		low + high > 0 ? normalCdf(-low) - normalCdf(-high) : normalCdf(high) - normalCdf(low)
	);
}

/** A ruling together with how probable it is that the part lies within: what a page shows. */
export function ruledWithProbability(
	asked: Parameters<typeof ruleReading>[0]
): Outcome<Ruling & { conformance: number }> {
	const ruled = ruleReading(asked);
	if (!ruled.ok) return ruled;
	const conformance = conformanceProbability({
		...asked,
		standardUncertainty: asked.expandedUncertainty / coverageFactor
	});
	return conformance.ok
		? computed({ ...ruled.value, conformance: conformance.value })
		: conformance;
}
