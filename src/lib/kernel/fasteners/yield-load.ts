import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/**
 * Load at which a bolt begins to yield.
 *
 * Formula: Fy = q · Re · A.
 * @param weakestMm2 A, area of its thinnest section, mm² @param yieldMPa Re, N/mm²
 * @param left q, what tightening leaves of the strength; 1 where it is not counted
 * @returns N
 * Source: definition of yield strength, ISO 898-1; q as VDI 2230 part 1.
 * @example yieldLoadN(61.2, 940) // 57 528
 */
export function yieldLoadN(weakestMm2: number, yieldMPa: number, left = 1): Outcome<number> {
	if (!(weakestMm2 > 0) || !(yieldMPa > 0))
		return cannot('area and yield strength are numbers above zero');
	if (!(left > 0) || left > 1)
		return cannot('what is left of the strength lies above 0 and up to 1');
	return computedNumber(left * yieldMPa * weakestMm2);
}

/**
 * Lasting stretch as a share of the length that was drawn.
 *
 * Formula: ε = ΔL / L.
 * @param lastingMm ΔL, mm, zero or more
 * @param lengthMm L of the section that yields, mm: the rest only springs
 * @returns a share
 * Source: definition of plastic strain.
 * @example lastingStrain(0.2, 35) // 0.0057
 */
export function lastingStrain(lastingMm: number, lengthMm: number): Outcome<number> {
	if (!(lastingMm >= 0) || !(lengthMm > 0)) return cannot('a stretch is a length, zero or more');
	return computedNumber(lastingMm / lengthMm);
}
