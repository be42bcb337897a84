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
	if (!(leastCountMm > 0) || !(calibrationExpandedMm >= 0))
		throw new RangeError('a least count above zero, a calibration uncertainty of zero or more');
	return Math.sqrt(leastCountMm ** 2 / 12 + (calibrationExpandedMm / coverageFactor) ** 2);
}

/**
 * Standard uncertainty of a difference of two independent readings: both count.
 *
 * Formula: u² = a² + b². Source: JCGM 100:2008, 5.1.2 with sensitivities +1 and −1.
 * @example ofDifferenceMm(0.003, 0.004) // 0.005
 */
export function ofDifferenceMm(aMm: number, bMm: number): number {
	return Math.hypot(aMm, bMm);
}

/** Expanded uncertainty U = k·u with k = 2, mm. Source: JCGM 100:2008, 6.2.1. */
export function expandedMm(standardMm: number): number {
	return coverageFactor * standardMm;
}
