/** Coverage factor for an expanded uncertainty of about 95 % (JCGM 100:2008, 6.3.3). */
export const coverageFactor = 2;

/**
 * Standard uncertainty of one reading from the instrument's least count and its calibration.
 *
 * Formula: u² = (least count)² / 12 + (U_cal / 2)²; the first term is a rectangular distribution
 * of full width one least count.
 * @param leastCountMm mm, above zero
 * @param calibrationExpandedMm U of the calibration, k = 2, mm
 * @returns mm
 * Source: JCGM 100:2008 (GUM), 4.3.7 and F.2.2.1.
 * @example standardUncertaintyMm(0.01, 0.002) // 0.00306
 */
export function standardUncertaintyMm(leastCountMm: number, calibrationExpandedMm: number): number {
	if (!(leastCountMm > 0)) throw new RangeError('a least count is above zero');
	return combined(leastCountMm / Math.sqrt(12), calibrationExpandedMm / coverageFactor);
}

/**
 * Standard uncertainty of a difference of two independent readings: both count.
 *
 * Formula: u² = a² + b².
 * @param aMm, bMm standard uncertainties, mm, zero or more
 * @returns mm
 * Source: JCGM 100:2008, 5.1.2 with sensitivities +1 and −1.
 * @example ofDifferenceMm(0.003, 0.004) // 0.005
 */
export function ofDifferenceMm(aMm: number, bMm: number): number {
	return combined(aMm, bMm);
}

/**
 * Expanded uncertainty, for about 95 %.
 *
 * Formula: U = k · u, k = 2.
 * @param standardMm standard uncertainty u, mm
 * @returns mm
 * Source: JCGM 100:2008, 6.2.1.
 * @example expandedMm(0.005) // 0.01
 */
export function expandedMm(standardMm: number): number {
	return coverageFactor * combined(standardMm, 0);
}

function combined(a: number, b: number): number {
	const u = Math.hypot(a, b);
	if (!(a >= 0) || !(b >= 0) || !Number.isFinite(u))
		throw new RangeError('an uncertainty is a number, zero or more');
	return u;
}
