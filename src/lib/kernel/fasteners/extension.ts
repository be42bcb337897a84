import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/**
 * L from grip to square and E from square to fastener in one length unit; the angle in degrees:
 * 0 straight on, 90 across, 180 back along the handle.
 */
export type Lever = { lengthL: number; extensionE: number; angleDeg: number };

/**
 * Length that the hand works with, from the grip to the fastener along the handle.
 *
 * Formula: Leff = L + E · cos φ.
 * @returns in the unit of L and E; "cannot" where nothing is left of the lever
 * Source: US Army TM 1-1500-204-23-9, chapter 8, figure 8-16.
 * @example effectiveLever({ lengthL: 400, extensionE: 100, angleDeg: 60 }) // 450
 */
export function effectiveLever({ lengthL, extensionE, angleDeg }: Lever): Outcome<number> {
	if (!(lengthL > 0) || !(extensionE >= 0)) return cannot('a lever has a length above zero');
	if (!Number.isFinite(angleDeg)) return cannot('the angle is no number');
	const effective = lengthL + extensionE * Math.cos((angleDeg * Math.PI) / 180);
	if (effective <= 1e-6 * lengthL)
		return cannot('the extension reaches back to the hand: there is no lever left');
	return computedNumber(effective);
}

/**
 * What to set on a torque wrench that drives through an extension or crowfoot.
 *
 * Formula: Tw = Ta · L / (L + E · cos φ).
 * @param lever with `torque` the wanted torque Ta at the fastener, in any torque unit, zero or more
 * @returns the setting, in the unit of Ta
 * Source: US Army TM 1-1500-204-23-9, chapter 8, figure 8-16; FAA AC 43.13-1B, 7-40.
 * @example wrenchSetting({ torque: 300, lengthL: 10, extensionE: 4, angleDeg: 0 }) // 214.3
 */
export function wrenchSetting(lever: Lever & { torque: number }): Outcome<number> {
	return turned(lever, (effective) => (lever.torque * lever.lengthL) / effective);
}

/**
 * What arrives at the fastener when the wrench clicks at a setting: the same rule turned round.
 *
 * Formula: Ta = Tw · (L + E · cos φ) / L.
 * @param lever with `torque` the setting Tw
 * @returns the torque at the fastener, in the unit of Tw
 * Source: as `wrenchSetting`.
 * @example torqueAtFastener({ torque: 50, lengthL: 400, extensionE: 60, angleDeg: 0 }) // 57.5
 */
export function torqueAtFastener(lever: Lever & { torque: number }): Outcome<number> {
	return turned(lever, (effective) => (lever.torque * effective) / lever.lengthL);
}

function turned(
	lever: Lever & { torque: number },
	rule: (effective: number) => number
): Outcome<number> {
	if (!(lever.torque >= 0)) return cannot('a torque is a number, zero or more');
	const effective = effectiveLever(lever);
	return effective.ok ? computedNumber(rule(effective.value)) : effective;
}
