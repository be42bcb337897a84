import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/**
 * Preload that a torque gives by a nut factor.
 *
 * Formula: F = T / (K · d). K is the least known of the three, so the result is a guide and never
 * a proof: a torque wrench alone scatters by about a quarter.
 * @param torqueNm N·m @param nutFactor K, about 0.1 to 0.35 @param diameterMm nominal, mm
 * @returns N
 * Source: FAA and NASA practice (T = K·D·F).
 * @example preloadN(50, 0.18, 10) // 27 778
 */
export function preloadN(torqueNm: number, nutFactor: number, diameterMm: number): Outcome<number> {
	if (!(torqueNm >= 0) || !(nutFactor > 0) || !(diameterMm > 0))
		return cannot('torque, nut factor and diameter are above zero');
	return computedNumber(torqueNm / (nutFactor * (diameterMm / 1000)));
}

/**
 * Torque for a wanted preload by a nut factor: the same rule turned round.
 *
 * Formula: T = K · d · F.
 * @param preload wanted preload F, N @param nutFactor K @param diameterMm nominal d, mm
 * @returns N·m
 * Source: FAA and NASA practice; five worked values in a fastening textbook (TP00 to TP04 of the
 * references).
 * @example torqueForPreloadNm(30_000, 0.2, 10) // 60
 */
export function torqueForPreloadNm(
	preload: number,
	nutFactor: number,
	diameterMm: number
): Outcome<number> {
	if (!(preload >= 0) || !(nutFactor > 0) || !(diameterMm > 0))
		return cannot('preload, nut factor and diameter are above zero');
	return computedNumber(nutFactor * (diameterMm / 1000) * preload);
}

/**
 * Preload that uses a share of what a bolt may bear.
 *
 * Formula: F = s · Fp.
 * @param share s, above 0 up to 1: 0.75 where the joint is taken apart again, 0.9 where it stays
 * @param proofN proof load Fp, N, above zero
 * @returns N
 * Source: textbook rule (references TP10 to TP13, TP40, TN9).
 * @example clampLoadN(0.75, 48_140) // 36 105
 */
export function clampLoadN(share: number, proofN: number): Outcome<number> {
	if (!(share > 0) || share > 1) return cannot('a share lies above 0 and up to 1');
	if (!(proofN > 0)) return cannot('a proof load is a number above zero');
	return computedNumber(share * proofN);
}

/**
 * What share of a load that a bolt bears a preload uses up: the same rule turned round.
 *
 * Formula: s = F / Fp.
 * @param preload F, N, zero or more @param bearsN proof, yield or tensile load, N, above zero
 * @returns a share: above 1 it bears no more
 * Source: as `clampLoadN`.
 * @example loadShare(36_105, 48_140) // 0.75
 */
export function loadShare(preload: number, bearsN: number): Outcome<number> {
	if (!(preload >= 0) || !(bearsN > 0)) return cannot('loads are numbers above zero');
	return computedNumber(preload / bearsN);
}
