import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

export type NextSize = {
	/** The step to machine to, mm; 0 where the standard size still cleans up. */
	stepMm: number;
	sizeMm: number;
	/** What is taken off the worst place, in diameter, mm. */
	leftMm: number;
};

/**
 * The next size to which a worn bore or journal cleans up.
 *
 * Formula: bore, smallest step with nominal + step ≥ largest reading + stock; journal, smallest step
 * with nominal − step ≤ smallest reading − stock.
 * @param part which way it is machined @param worstMm largest reading of a bore, smallest of a
 *   journal, mm @param nominalMm standard size, mm @param stepsMm oversizes or undersizes, above zero, mm
 * @param stockMm what machining needs to clean up, in diameter, mm, zero or more
 * @returns the step, its size and what it takes off; "cannot" where the largest step does not clean up
 * Source: definition; undersize as in US Army TM 5-3805-262-34, p. 4-24; the stock is the machinist's.
 * @example nextSize('bore', 74.13, 74, [0.25, 0.5], 0.05) // step 0.25, size 74.25
 */
export function nextSize(
	part: 'bore' | 'journal',
	worstMm: number,
	nominalMm: number,
	stepsMm: readonly number[],
	stockMm: number
): Outcome<NextSize> {
	if (!(worstMm > 0) || !(nominalMm > 0) || ![worstMm, nominalMm].every((one) => one < 1e5))
		return cannot('a diameter is a number above zero');
	if (!(stockMm >= 0) || stockMm > 10) return cannot('the stock to clean up is zero to 10 mm');
	if (stepsMm.length === 0) return cannot('the list has no size to machine to');
	if (stepsMm.some((one) => !(one > 0) || one > 50))
		return cannot('a step in size is a number above zero, in millimetres');
	const sign = part === 'bore' ? 1 : -1;
	for (const stepMm of stepsMm.toSorted((a, b) => a - b)) {
		const sizeMm = tidy(nominalMm + sign * stepMm);
		const leftMm = tidy(sign * (sizeMm - worstMm));
		if (sizeMm > 0 && leftMm >= stockMm - 1e-9) return computed({ stepMm, sizeMm, leftMm });
	}
	return cannot('no listed size cleans it up: sleeve it, build it up, or choose another part');
}
