import { normalQuantile, normalUpperTail } from '../statistics/distributions/normal';

/**
 * The guard band, in standard uncertainties, that keeps the risk of calling a part within that is
 * out, for the worst reading accepted, down to what is allowed at one limit.
 *
 * Formula: g = z with Φ(z) = 1 − risk, times u.
 * @param risk between 0 and 1
 * @returns multiple of u
 * @throws RangeError on misuse
 * Source: JCGM 106:2012, 8.3.2.
 * @example guardBandForRisk(0.05) // 1.645
 */
export function guardBandForRisk(risk: number): number {
	// Adding zero makes the multiple at one half a plain 0 rather than −0.
	return -normalQuantile(risk) + 0;
}

/**
 * The risk that a part read just inside the acceptance limit is out nevertheless.
 *
 * Formula: 1 − Φ(2 w / U).
 * @param bandOverExpanded guard band over expanded uncertainty (k = 2), below zero where readings
 * beyond the limit are accepted
 * @returns probability, 0 to 1
 * @throws RangeError where it is no number
 * Source: JCGM 106:2012, 8.3.2; ILAC-G8:09/2019, table 1.
 * @example riskAtGuardBand(1) // 0.0228
 */
export function riskAtGuardBand(bandOverExpanded: number): number {
	return normalUpperTail(2 * bandOverExpanded);
}
