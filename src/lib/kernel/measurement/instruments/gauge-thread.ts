import { computedNumber } from '../../computed-number';
import { cannot, computed, type Outcome } from '../../outcome';
import { lengthMm } from '../../quantity/units';

type Thread = { name: string; leastMm: number; mostMm: number };
const ofInches = (name: string, least: number, most: number): Thread => ({
	name,
	leastMm: least * lengthMm.in,
	mostMm: most * lengthMm.in
});

/**
 * Clearances that gauging thread is made for. The width is read with the scale of its own pack:
 * no table holds for another's.
 * Source: colours as printed on tool pages (0.001 to 0.003 in and so on); types A to E as in an
 * encyclopaedia article on the product.
 */
export const gaugeThreads: readonly Thread[] = [
	ofInches('green', 0.001, 0.003),
	ofInches('red', 0.002, 0.006),
	ofInches('blue', 0.004, 0.009),
	{ name: 'type A', leastMm: 0.025, mostMm: 0.175 },
	{ name: 'type B', leastMm: 0.1, mostMm: 0.25 },
	{ name: 'type C', leastMm: 0.175, mostMm: 0.5 },
	{ name: 'type D', leastMm: 0.5, mostMm: 1 },
	{ name: 'type E', leastMm: 0.75, mostMm: 1.75 }
];

/**
 * The gauging threads whose range holds both limits of a clearance.
 * @param leastMm, mostMm limits of the clearance, mm
 * @returns their names; "cannot" where the limits cross or are none
 * @example threadsFor(0.03, 0.07) // ['green', 'type A']
 */
export function threadsFor(leastMm: number, mostMm: number): Outcome<string[]> {
	if (!(leastMm >= 0) || !(mostMm >= leastMm) || !Number.isFinite(mostMm))
		return cannot('a clearance runs from its least to its most, zero or more');
	return computed(
		gaugeThreads
			.filter((one) => one.leastMm <= leastMm && one.mostMm >= mostMm)
			.map(({ name }) => name)
	);
}

/**
 * Taper as gauging thread shows it: the clearance at one end of the strip less that at the other.
 *
 * Formula: |c1 − c2|; journal, bearing or both.
 * @param one, other clearances at the two ends, zero or more, one unit
 * @returns in that unit
 * Source: definition; US Army TM 5-3895-383-24, p. 8-59 (the strip along the journal).
 * @example threadTaper(0.0025, 0.0015) // 0.001
 */
export function threadTaper(one: number, other: number): Outcome<number> {
	if (!(one >= 0) || !(other >= 0)) return cannot('a clearance is zero or more');
	return computedNumber(Math.abs(one - other));
}
