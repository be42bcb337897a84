import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/** Young's moduli of what is clamped, N/mm². Source: common handbook values, cast iron of middle grade. */
export const partModulusMPa = { steel: 205_000, iron: 100_000, aluminium: 70_000 } as const;
export type PartMaterial = keyof typeof partModulusMPa;

/**
 * Stiffness of clamped parts by how many times stiffer than the bolt they are.
 *
 * Formula: kj = n · kb.
 * @param times n, above zero: two to five are met in heads and caps (common practice, no source)
 * @param boltNPerMm kb, N/mm
 * @returns N/mm
 * Source: definition of a ratio of stiffnesses.
 * @example timesAsStiffNPerMm(3, 132_000) // 396 000
 */
export function timesAsStiffNPerMm(times: number, boltNPerMm: number): Outcome<number> {
	if (!(times > 0) || !(boltNPerMm > 0)) return cannot('a stiffness is a number above zero');
	return computedNumber(times * boltNPerMm);
}

/**
 * Stiffness of clamped parts taken as a sleeve around the bolt.
 *
 * Formula: k = E · π/4 · (D² − dh²) / L.
 * @param outerMm D, mm: the width that the clamping force spreads to @param holeMm dh, mm
 * @param lengthMm L, mm @param modulusMPa E of the parts, N/mm²
 * @returns N/mm
 * Source: Hooke's law for a sleeve, the plainest form of the clamped solid in VDI 2230 part 1.
 * @example sleeveStiffnessNPerMm(20, 11, 80, 70_000) // 191 700
 */
export function sleeveStiffnessNPerMm(
	outerMm: number,
	holeMm: number,
	lengthMm: number,
	modulusMPa: number
): Outcome<number> {
	if (!(holeMm > 0) || !(outerMm > holeMm)) return cannot('the sleeve is wider than its hole');
	if (!(lengthMm > 0) || !(modulusMPa > 0))
		return cannot('length and modulus are numbers above zero');
	return computedNumber((modulusMPa * (Math.PI / 4) * (outerMm ** 2 - holeMm ** 2)) / lengthMm);
}

/**
 * Stiffness of a clamped layer, taken as a cone of 30° that the force spreads into.
 *
 * Formula: k = 0.5774 π · E · d / ln((1.155 t + D − d)(D + d) / ((1.155 t + D + d)(D − d))).
 * @param faceMm D, mm: diameter that presses at the narrow end @param boltMm d, mm, below D
 * @param thicknessMm t, mm @param modulusMPa E of the layer, N/mm²
 * @returns N/mm
 * Source: Shigley's Mechanical Engineering Design, chapter 8, stiffness of members (frustum of 30°).
 * @example coneStiffnessNPerMm(15, 10, 20, 207_000) // 3 503 000
 */
export function coneStiffnessNPerMm(
	faceMm: number,
	boltMm: number,
	thicknessMm: number,
	modulusMPa: number
): Outcome<number> {
	if (!(boltMm > 0) || !(faceMm > boltMm))
		return cannot('the face under the head is wider than the bolt');
	if (!(thicknessMm > 0) || !(modulusMPa > 0))
		return cannot('length and modulus are numbers above zero');
	const spread = 1.155 * thicknessMm;
	// In steps, so that very long and very wide joints overflow nowhere.
	const inside = (spread + faceMm - boltMm) / (spread + faceMm + boltMm);
	const outside = (faceMm + boltMm) / (faceMm - boltMm);
	return computedNumber((0.5774 * Math.PI * modulusMPa * boltMm) / Math.log(inside * outside));
}

/**
 * Stiffness of parts of one material between two like faces: a cone from each, half the grip high.
 *
 * Formula: k = k(cone of L/2) / 2.
 * @param faceMm diameter under head and nut, mm @param boltMm d, mm @param gripMm L, mm
 * @param modulusMPa E of the parts, N/mm²
 * @returns N/mm
 * Source: as `coneStiffnessNPerMm`, two like cones in series.
 * @example jointOfConesNPerMm(15, 10, 40, 207_000) // 1 751 000
 */
export function jointOfConesNPerMm(
	faceMm: number,
	boltMm: number,
	gripMm: number,
	modulusMPa: number
): Outcome<number> {
	const cone = coneStiffnessNPerMm(faceMm, boltMm, gripMm / 2, modulusMPa);
	return cone.ok ? computedNumber(cone.value / 2) : cone;
}
