import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/** Young's modulus of steel, N/mm². Source: common handbook value, 205 GPa. */
export const steelModulusMPa = 205_000;

export type Section = { lengthMm: number; areaMm2: number };

/**
 * Elastic stretch of a bolt under load, section by section.
 *
 * Formula: ΔL = F / E · Σ (Li / Ai).
 * @param loadN F, N, zero or more @param sections lengths in mm and areas in mm² of shank and thread
 * @param modulusMPa E, N/mm²
 * @returns mm
 * Source: Hooke's law for bars in series.
 * @example stretchMm(40_000, [{ lengthMm: 80, areaMm2: 58 }]) // 0.269
 */
export function stretchMm(
	loadN: number,
	sections: readonly Section[],
	modulusMPa = steelModulusMPa
): Outcome<number> {
	if (!(loadN >= 0)) return cannot('a load is a number, zero or more');
	const stiffness = boltStiffnessNPerMm(sections, modulusMPa);
	return stiffness.ok ? computedNumber(loadN / stiffness.value) : stiffness;
}

/**
 * Stiffness of a bolt made of sections.
 *
 * Formula: k = E / Σ (Li / Ai).
 * @param sections as `stretchMm`, at least one @param modulusMPa E, N/mm²
 * @returns N/mm
 * Source: Hooke's law for bars in series; VDI 2230 part 1, bolt resilience.
 * @example boltStiffnessNPerMm([{ lengthMm: 80, areaMm2: 58 }]) // 148 600
 */
export function boltStiffnessNPerMm(
	sections: readonly Section[],
	modulusMPa = steelModulusMPa
): Outcome<number> {
	if (sections.length === 0) return cannot('a bolt has at least one section');
	if (sections.some((one) => !(one.lengthMm > 0) || !(one.areaMm2 > 0)) || !(modulusMPa > 0))
		return cannot('each section has a length and an area above zero');
	return computedNumber(
		modulusMPa / sections.reduce((sum, one) => sum + one.lengthMm / one.areaMm2, 0)
	);
}

/**
 * Load that a measured stretch stands for: the same rule turned round. It holds below yield alone.
 *
 * Formula: F = ΔL · E / Σ (Li / Ai).
 * @param stretch ΔL, mm, zero or more: length tightened less length free
 * @param sections as `stretchMm` @param modulusMPa E, N/mm²
 * @returns N
 * Source: as `stretchMm`.
 * @example preloadOfStretchN(0.269, [{ lengthMm: 80, areaMm2: 58 }]) // 39 980
 */
export function preloadOfStretchN(
	stretch: number,
	sections: readonly Section[],
	modulusMPa = steelModulusMPa
): Outcome<number> {
	if (!(stretch >= 0)) return cannot('a stretch is a length, zero or more');
	const stiffness = boltStiffnessNPerMm(sections, modulusMPa);
	return stiffness.ok ? computedNumber(stretch * stiffness.value) : stiffness;
}

/**
 * Two springs in series: bolt and parts give way to the same turn together.
 *
 * Formula: k = a · b / (a + b).
 * @param a, b N/mm, above zero
 * @returns N/mm, less than either
 * Source: springs in series.
 * @example inSeriesNPerMm(150_000, 450_000) // 112 500
 */
export function inSeriesNPerMm(a: number, b: number): Outcome<number> {
	if (!(a > 0) || !(b > 0)) return cannot('a stiffness is a number above zero');
	return computedNumber(a / (1 + a / b));
}
