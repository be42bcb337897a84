import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/** Shares of full scale: below the first no accuracy is stated for a torque wrench. */
export const accuracyFrom = 0.2;
/** Between these a torque wrench is at its best. */
export const bestRange = { least: 0.3, most: 0.8 } as const;
/** What a sound wrench may be out by, of the reading, from a fifth of its scale upwards. */
export const usualAccuracy = 0.04;

/**
 * How far up its scale a torque wrench is used.
 *
 * Formula: share = Tw / Tfull.
 * @param setting above zero @param fullScale in the same unit
 * @returns a share, 0 to 1; "cannot" where the wrench does not reach the setting
 * Source: US Army TM 1-1500-204-23-9, table 8-1 and the paragraph before 8-4 (references X25, X26).
 * @example shareOfScale(40, 200) // 0.2
 */
export function shareOfScale(setting: number, fullScale: number): Outcome<number> {
	if (!(setting > 0) || !(fullScale > 0)) return cannot('a torque to set is above zero');
	if (setting > fullScale) return cannot('this wrench does not reach so far: take a larger one');
	return computedNumber(setting / fullScale);
}
