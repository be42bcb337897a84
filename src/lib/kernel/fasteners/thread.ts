import { cannot, computed, type Outcome } from '../outcome';

/** Diameters of a 60° thread below its nominal one, in pitches. Source: ISO 724, ISO 898-1, ASME B1.1. */
const pitchDrop = 0.649519;
const minorDrop = 1.082532;
const rootDrop = 1.226869;

export type Thread = {
	diameterMm: number;
	pitchMm: number;
	/** d2, where the flanks carry. */
	pitchDiameterMm: number;
	/** D1, of the nut. */
	minorDiameterMm: number;
	/** d3, at the bolt's root. */
	rootDiameterMm: number;
	leadAngleDeg: number;
};

/**
 * Geometry of an ISO metric or unified thread (both have the 60° profile).
 *
 * Formula: d2 = d − 0.649519 P; D1 = d − 1.082532 P; d3 = d − 1.226869 P; φ = atan(P / (π · d2)).
 * @param diameterMm nominal diameter d, mm @param pitchMm pitch P, mm, below d/2; a unified
 *   thread's is 25.4 over its threads per inch
 * @returns diameters in mm, lead angle in degrees
 * Source: ISO 724:1993; d3 as ISO 898-1:2013, 9.1.6.1.
 * @example threadOf(10, 1.5) // pitch diameter 9.026 mm, lead angle 3.03°
 */
export function threadOf(diameterMm: number, pitchMm: number): Outcome<Thread> {
	if (!(diameterMm > 0) || !(pitchMm > 0) || !(pitchMm < diameterMm / 2))
		return cannot('a thread has a diameter and a much smaller pitch');
	if (!Number.isFinite(diameterMm)) return cannot('the diameter is no number');
	const pitchDiameterMm = diameterMm - pitchDrop * pitchMm;
	return computed({
		diameterMm,
		pitchMm,
		pitchDiameterMm,
		minorDiameterMm: diameterMm - minorDrop * pitchMm,
		rootDiameterMm: diameterMm - rootDrop * pitchMm,
		leadAngleDeg: (Math.atan(pitchMm / (Math.PI * pitchDiameterMm)) * 180) / Math.PI
	});
}
