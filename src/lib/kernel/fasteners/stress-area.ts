import { cannot, computed, type Outcome } from '../outcome';

/** Pitch diameter and root diameter below the nominal one, in pitches (ISO 724, ISO 898-1). */
const pitchDiameterDrop = 0.649519;
const rootDiameterDrop = 1.226869;

/**
 * Nominal stress area of an ISO metric thread.
 *
 * Formula: As = π/4 · ((d2 + d3)/2)², d2 = d − 0.649519 P, d3 = d − 1.226869 P.
 * @param diameterMm nominal diameter d, mm @param pitchMm pitch P, mm, below d/2
 * @returns mm²
 * Source: ISO 898-1:2013, 9.1.6.1, with diameters of ISO 724.
 * @example stressAreaMm2(10, 1.5) // 58.0
 */
export function stressAreaMm2(diameterMm: number, pitchMm: number): Outcome<number> {
	if (!(diameterMm > 0) || !(pitchMm > 0) || pitchMm >= diameterMm / 2)
		return cannot('a thread has a diameter and a much smaller pitch');
	const mean = diameterMm - ((pitchDiameterDrop + rootDiameterDrop) / 2) * pitchMm;
	return computed((Math.PI / 4) * mean ** 2);
}

/**
 * Stress area of a unified inch thread.
 *
 * Formula: As = 0.7854 · (d − 0.9743/n)².
 * @param diameterIn inches @param threadsPerInch n
 * @returns in²
 * Source: ASME B1.1, tensile stress area.
 * @example stressAreaIn2(0.5, 13) // 0.1419
 */
export function stressAreaIn2(diameterIn: number, threadsPerInch: number): Outcome<number> {
	if (!(diameterIn > 0) || !(threadsPerInch > 0) || 1 / threadsPerInch >= diameterIn / 2)
		return cannot('a thread has a diameter and a much smaller pitch');
	return computed(0.7854 * (diameterIn - 0.9743 / threadsPerInch) ** 2);
}

/** Stress under proof load, N/mm². Source: ISO 898-1:2013, table 3 (8.8 up to M16, and above it). */
export function proofStressMPa(propertyClass: '8.8' | '10.9' | '12.9', diameterMm: number): number {
	if (propertyClass === '8.8') return diameterMm <= 16 ? 580 : 600;
	return propertyClass === '10.9' ? 830 : 970;
}

/**
 * Proof load of a bolt: what it bears and still springs back.
 *
 * Formula: Fp = As · Sp, with As to three significant figures, as the standard's tables have it.
 * Source: ISO 898-1:2013, table 5.
 * @returns N
 * @example proofLoadN(10, 1.25, '10.9') // 50 796
 */
export function proofLoadN(
	diameterMm: number,
	pitchMm: number,
	propertyClass: '8.8' | '10.9' | '12.9'
): Outcome<number> {
	const area = stressAreaMm2(diameterMm, pitchMm);
	if (!area.ok) return area;
	return computed(Number(area.value.toPrecision(3)) * proofStressMPa(propertyClass, diameterMm));
}

/**
 * Preload that a torque gives by a nut factor.
 *
 * Formula: F = T / (K · d). Source: FAA and NASA practice (T = K·D·F); K is the least known of
 * the three, so the result is a guide and never a proof.
 * @param torqueNm N·m @param nutFactor K, about 0.1 to 0.35 @param diameterMm mm
 * @returns N
 * @example preloadN(50, 0.18, 10) // 27 778
 */
export function preloadN(torqueNm: number, nutFactor: number, diameterMm: number): Outcome<number> {
	if (!(torqueNm >= 0) || !(nutFactor > 0) || !(diameterMm > 0))
		return cannot('torque, nut factor and diameter are above zero');
	return computed(torqueNm / (nutFactor * (diameterMm / 1000)));
}
