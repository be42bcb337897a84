import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/**
 * Torque to set on a self-locking nut: what the locking drags is added to what the joint wants.
 *
 * Formula: T = wanted + drag.
 * @param wanted, drag in one unit of torque, zero or more
 * @returns the same unit
 * Source: FAA AC 43.13-1B, 7-40 (drag torque is added); reference entry X22.
 * @example withDrag(50, 8) // 58
 */
export function withDrag(wanted: number, drag: number): Outcome<number> {
	if (!(wanted >= 0) || !(drag >= 0)) return cannot('a torque is a number, zero or more');
	return computedNumber(wanted + drag);
}

/**
 * What is wrong at the fastener when an extension was forgotten.
 *
 * Formula: error = E · cos φ / L.
 * @param lengthL, extensionE one unit of length @param angleDeg 0 straight on
 * @returns a share: 0.15 is 15 % over
 * Source: from the wrench rule, US Army TM 1-1500-204-23-9, figure 8-16; reference entry X21.
 * @example forgottenExtension(400, 60, 0) // 0.15
 */
export function forgottenExtension(
	lengthL: number,
	extensionE: number,
	angleDeg: number
): Outcome<number> {
	if (!(lengthL > 0) || !(extensionE >= 0) || !Number.isFinite(angleDeg))
		return cannot('a lever has a length above zero');
	return computedNumber((extensionE * Math.cos((angleDeg * Math.PI) / 180)) / lengthL);
}
