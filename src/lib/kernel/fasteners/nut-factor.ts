import { cannot, type Outcome } from '../outcome';
import { computedNumber } from '../computed-number';

/** The least gives the hardest pull for a torque, the most the softest. */
export type NutFactorRange = { least: number; most: number };
export type Lubrication = 'dry' | 'zinc' | 'oiled' | 'anti-seize' | 'waxed';

/**
 * Nut factors that bracket a lubrication. Published values for one finish differ, so each is a
 * range, and none is a proof.
 * Source: textbook and supplier tables (references K-a to K-k).
 */
export const nutFactors: Readonly<Record<Lubrication, NutFactorRange>> = {
	dry: { least: 0.18, most: 0.25 },
	zinc: { least: 0.2, most: 0.25 },
	oiled: { least: 0.15, most: 0.2 },
	'anti-seize': { least: 0.12, most: 0.16 },
	waxed: { least: 0.1, most: 0.14 }
};

/**
 * Nut factor to set a torque by, where only its range is known.
 *
 * Formula: K = (least + most) / 2.
 * @param range both above zero, least first
 * @returns the middle: the preload then misses to both sides alike
 * Source: definition of the middle of a range.
 * @example middleNutFactor({ least: 0.15, most: 0.2 }) // 0.175
 */
export function middleNutFactor({ least, most }: NutFactorRange): Outcome<number> {
	if (!(least > 0) || !(most >= least))
		return cannot('the nut factors are above zero, the least first');
	return computedNumber((least + most) / 2);
}
