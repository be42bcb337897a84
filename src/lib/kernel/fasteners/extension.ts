import { cannot, computed, type Outcome } from '../outcome';

/**
 * What to set on a torque wrench that drives through an extension or crowfoot.
 *
 * Formula: Tw = Ta · L / (L + E · cos φ).
 * @param lever wanted torque Ta at the fastener (any torque unit), L from grip to square and E from
 *   square to fastener (one length unit), φ in degrees: 0 straight on, 90 across, 180 back along the handle
 * @returns the setting, in the unit of Ta
 * Source: US Army TM 1-1500-204-23-9, chapter 8, figure 8-16; FAA AC 43.13-1B, 7-40.
 * @example wrenchSetting({ torque: 300, lengthL: 10, extensionE: 4, angleDeg: 0 }) // 214.3
 */
export function wrenchSetting(lever: Lever & { torque: number }): Outcome<number> {
	const factor = leverFactor(lever);
	return factor.ok ? computed(lever.torque / factor.value) : factor;
}

/**
 * What arrives at the fastener when the wrench clicks at a setting: the same rule turned round.
 *
 * Formula: Ta = Tw · (L + E · cos φ) / L. Source: as `wrenchSetting`.
 * @example torqueAtFastener({ torque: 214.3, lengthL: 10, extensionE: 4, angleDeg: 0 }) // 300
 */
export function torqueAtFastener(lever: Lever & { torque: number }): Outcome<number> {
	const factor = leverFactor(lever);
	return factor.ok ? computed(lever.torque * factor.value) : factor;
}

export type Lever = { lengthL: number; extensionE: number; angleDeg: number };

function leverFactor({ lengthL, extensionE, angleDeg }: Lever): Outcome<number> {
	if (!(lengthL > 0) || !(extensionE >= 0)) return cannot('a lever has a length above zero');
	if (!Number.isFinite(angleDeg)) return cannot('the angle is no number');
	const along = extensionE * Math.cos((angleDeg * Math.PI) / 180);
	const factor = (lengthL + along) / lengthL;
	if (factor <= 1e-6)
		return cannot('the extension reaches back to the hand: there is no lever left');
	return computed(factor);
}
