import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

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
	return computedNumber((Math.PI / 4) * mean ** 2);
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
	return computedNumber(0.7854 * (diameterIn - 0.9743 / threadsPerInch) ** 2);
}
