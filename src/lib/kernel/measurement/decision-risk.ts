import { cannot, computed, type Outcome } from '../outcome';
import { normalCdf, normalDensity } from '../statistics/distributions/normal';
import { integral } from './integrate';
import type { Known } from './known-before';
import type { Limits } from './ruling';

export type DecisionRisk = {
	/** Parts that lie within the limits. */
	conforming: number;
	/** Parts whose reading is accepted. */
	accepted: number;
	/** Accepted and yet out. */
	consumer: number;
	/** Within and yet refused. */
	producer: number;
	/** Of those accepted, the part that is out; of those refused, the part that is within. */
	falseAccept: number | undefined;
	falseReject: number | undefined;
};

/**
 * What a way of ruling does to many parts of one kind: how often it passes a bad one and how often
 * it turns away a good one.
 *
 * Formula: R_C = ∫ p(x) P(accept | x) dx over parts out of limits; R_P = ∫ p(x) (1 − P(accept | x))
 * dx over parts within; P(accept | x) = Φ((A_U − x) / u) − Φ((A_L − x) / u).
 * @param asked before: how the parts lie, normal; u of one reading, above zero; tolerance: their
 * limits; acceptance: between which a reading is accepted
 * @returns joint probabilities, and the two conditional ones (undefined where nothing is accepted
 * or refused)
 * Source: JCGM 106:2012, 9.3 and 9.4.
 * @example decisionRisk({ before: { mean: 1500, standard: 0.12 }, standardUncertainty: 0.04,
 *   tolerance: { least: 1499.8, most: 1500.2 }, acceptance: { least: 1499.82, most: 1500.18 } })
 *   // consumer 0.00988, producer 0.0690
 */
export function decisionRisk(asked: {
	before: Known;
	standardUncertainty: number;
	tolerance: Limits;
	acceptance: Limits;
}): Outcome<DecisionRisk> {
	const { before, standardUncertainty: u } = asked;
	const { mean, standard: s } = before;
	if (!Number.isFinite(mean) || ![s, u].every((one) => one > 0 && Number.isFinite(one)))
		return cannot('how the parts lie and how well they are read are numbers above zero');
	// In deviations of the parts, from their mean: the same for any unit.
	const scaled = ({ least = -Infinity, most = Infinity }: Limits) =>
		[(least - mean) / s, (most - mean) / s] as const;
	const [least, most] = scaled(asked.tolerance);
	const [from, to] = scaled(asked.acceptance);
	if (least === -Infinity && most === Infinity) return cannot('there is no limit to rule by');
	if (!(most >= least)) return cannot('the least limit lies above the most');
	if (!(to >= from)) return cannot('nothing would be accepted: the acceptance limits cross');
	const r = u / s;
	const accept = (x: number) => normalCdf((to - x) / r) - normalCdf((from - x) / r);
	const refuse = (x: number) => normalCdf((x - to) / r) + normalCdf((from - x) / r);
	const marks = [from, to]
		.filter(Number.isFinite)
		.flatMap((limit) => bends.map((k) => limit + k * r))
		.concat(bends);
	const over = (f: (x: number) => number, a: number, b: number) =>
		integral((x) => normalDensity(x) * f(x), Math.max(a, -farOut), Math.min(b, farOut), marks);
	const consumer = over(accept, -Infinity, least) + over(accept, most, Infinity);
	const producer = over(refuse, least, most);
	const conforming = normalCdf(most) - normalCdf(least);
	const reach = Math.hypot(1, r);
	const accepted = normalCdf(to / reach) - normalCdf(from / reach);
	return computed({
		conforming,
		accepted,
		consumer,
		producer,
		falseAccept: accepted > 0 ? Math.min(1, consumer / accepted) : undefined,
		falseReject: accepted < 1 ? Math.min(1, producer / (1 - accepted)) : undefined
	});
}

/** No part this many deviations from the mean counts in seventeen figures. */
const farOut = 9;
const bends = [-8, -6, -5, -4, -3, -2, -1, 0, 1, 2, 3, 4, 5, 6, 8];
