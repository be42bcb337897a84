import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/**
 * Chamber that is left in a head after its face was skimmed.
 *
 * Formula: V = V0 − A · c / 10.
 * @param chamberCm3 V0 before, cm³ @param openingCm2 A, the chamber's opening at the face, cm²
 * @param cutMm c, taken off the face, mm, zero or more
 * @returns cm³; "cannot" where the cut goes through the chamber
 * Source: volume of a slice; reference entry D20.
 * @example skimmedChamberCm3(52.6, 50, 0.2) // 51.6
 */
export function skimmedChamberCm3(
	chamberCm3: number,
	openingCm2: number,
	cutMm: number
): Outcome<number> {
	if (!(chamberCm3 > 0) || !(openingCm2 > 0) || !(cutMm >= 0))
		return cannot('chamber and opening are numbers above zero, and a cut is no less than nothing');
	const leftCm3 = chamberCm3 - (openingCm2 * cutMm) / 10;
	return leftCm3 > 0 ? computedNumber(leftCm3) : cannot('nothing of the chamber is left');
}
