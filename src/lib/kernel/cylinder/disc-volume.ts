import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/**
 * Volume of a flat round space: a gasket's bore, the deck above a piston, a slice of the cylinder.
 *
 * Formula: V = π/4 · D² · h.
 * @param diameterMm D, mm, above zero @param heightMm h, mm; below zero where a piston stands proud
 * @returns cm³, with the sign of the height
 * Source: definition.
 * @example discVolumeCm3(104.14, 1.0414) // 8.87
 */
export function discVolumeCm3(diameterMm: number, heightMm: number): Outcome<number> {
	if (!(diameterMm > 0) || diameterMm > 1e4) return cannot('a diameter is a number above zero');
	if (!(Math.abs(heightMm) <= 1e4)) return cannot('a height is a number in millimetres');
	return computedNumber(((Math.PI / 4) * diameterMm ** 2 * heightMm) / 1000);
}

/**
 * Height of a flat round space of a volume: the same rule turned round.
 *
 * Formula: h = V / (π/4 · D²).
 * @param volumeCm3 V, cm³, with a sign @param diameterMm D, mm, above zero
 * @returns mm, with the sign of the volume
 * Source: as `discVolumeCm3`.
 * @example discHeightMm(8.87, 104.14) // 1.0414
 */
export function discHeightMm(volumeCm3: number, diameterMm: number): Outcome<number> {
	if (!(diameterMm > 0) || diameterMm > 1e4) return cannot('a diameter is a number above zero');
	return computedNumber((volumeCm3 * 1000) / ((Math.PI / 4) * diameterMm ** 2));
}
