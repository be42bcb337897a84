import { ofMean } from './repeats';
import { expandedMm, standardUncertaintyMm } from './uncertainty';

/** What is known of an instrument before anything is measured with it. */
export type InHand = {
	leastCountMm: number;
	/** U of its calibration, k = 2. */
	calibrationMm: number;
	/** Scatter s of one reading by this person on such a part, zero where it is not known. */
	scatterMm: number;
};

/**
 * Expanded uncertainty of a mean of n readings with an instrument, from what is known beforehand.
 *
 * Formula: U = 2 · √(s² / n + δ² / 12 + (U_cal / 2)²).
 * @param instrument least count δ above zero, calibration and scatter, zero or more, mm
 * @param n readings, whole, 1 or more
 * @returns mm
 * @throws RangeError on misuse
 * Source: JCGM 100:2008 (GUM), 4.2.3, F.2.2.1 and 6.2.1.
 * @example inHandMm({ leastCountMm: 0.001, calibrationMm: 0.002, scatterMm: 0.001 }, 1) // 0.00289
 */
export function inHandMm(instrument: InHand, n: number): number {
	return expandedMm(ofMean(instrument.scatterMm, sharedMm(instrument), n));
}

/** What repeating cannot shrink: least count and calibration, as a standard uncertainty. */
export function sharedMm({ leastCountMm, calibrationMm }: InHand): number {
	return standardUncertaintyMm(leastCountMm, calibrationMm);
}
