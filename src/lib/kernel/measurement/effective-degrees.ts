import { cannot, computed, type Outcome } from '../outcome';
import { tQuantile } from '../statistics/distributions/student-t';
import { combinedStandard } from './combined';
import type { Component } from './component';

/**
 * Effective degrees of freedom of a combined standard uncertainty: how well it is known itself.
 *
 * Formula: ν = u⁴ / Σ (cᵢ uᵢ)⁴ / νᵢ (Welch and Satterthwaite).
 * @param components independent ones
 * @returns above zero, Infinity where every part is taken as known; "cannot" as combinedStandard,
 * and where nothing is uncertain
 * Source: JCGM 100:2008 (GUM), G.4.1.
 * @example effectiveDegrees([{ name: 'repeats', type: 'A', standard: 0.003, sensitivity: 1,
 *   degreesOfFreedom: 4 }, { name: 'calibration', type: 'B', standard: 0.004, sensitivity: 1,
 *   degreesOfFreedom: Infinity }]) // 30.86
 */
export function effectiveDegrees(components: readonly Component[]): Outcome<number> {
	const combined = combinedStandard(components);
	if (!combined.ok) return combined;
	if (combined.value === 0) return cannot('nothing in it is uncertain');
	// As shares of the whole: fourth powers of thousandths of a millimetre would lose figures.
	const sum = components.reduce(
		(all, { sensitivity, standard, degreesOfFreedom }) =>
			all + ((sensitivity * standard) / combined.value) ** 4 / degreesOfFreedom,
		0
	);
	return computed(1 / sum);
}

/**
 * Coverage factor for 95 % from degrees of freedom: few repeats know their own scatter badly.
 *
 * Formula: k = t with 97.5 % below, for ν degrees of freedom.
 * @param degreesOfFreedom above zero, may be Infinity (then 1.96)
 * @throws RangeError on misuse
 * Source: JCGM 100:2008 (GUM), G.3 and table G.2.
 * @example coverageFactor95(4) // 2.776
 */
export function coverageFactor95(degreesOfFreedom: number): number {
	return tQuantile(0.975, degreesOfFreedom);
}
