import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';

export type Column = {
	areaMm2: number;
	/** Effective length over radius of gyration, a bare number. */
	slenderness: number;
	yieldMPa: number;
	modulusMPa: number;
};
export type Buckling = { loadN: number; rule: 'Euler' | 'Johnson'; transition: number };

/**
 * Load at which a rod or push rod buckles: why a cylinder full of water bends a rod.
 *
 * Formula: λt = √(2π²E/Re); below it F = A · Re · (1 − Re · λ² / (4π²E)), above it F = π²EA/λ².
 * @param column area in mm², slenderness, yield and modulus in N/mm²
 * @returns N, the rule that governs and the slenderness at which they meet
 * Source: Johnson's parabola and Euler's column as the machine-design textbooks have them
 *   (reference entries B02, B03 and B06).
 * @example bucklingOf({ areaMm2: 250, slenderness: 12.08, yieldMPa: 550, modulusMPa: 206_000 }) // 136.1 kN, Johnson
 */
export function bucklingOf(column: Column): Outcome<Buckling> {
	const { areaMm2, slenderness, yieldMPa, modulusMPa } = column;
	if (![areaMm2, slenderness, yieldMPa, modulusMPa].every((one) => one > 0))
		return cannot('area, slenderness, yield and modulus are numbers above zero');
	const transition = Math.sqrt((2 * Math.PI ** 2 * modulusMPa) / yieldMPa);
	const short = slenderness < transition;
	const load = computedNumber(
		short
			? areaMm2 * yieldMPa * (1 - (yieldMPa * slenderness ** 2) / (4 * Math.PI ** 2 * modulusMPa))
			: (Math.PI ** 2 * modulusMPa * areaMm2) / slenderness ** 2
	);
	if (!load.ok) return load;
	if (!Number.isFinite(transition)) return cannot('yield and modulus are out of all proportion');
	return computed({ loadN: load.value, rule: short ? 'Johnson' : 'Euler', transition });
}

/**
 * Slenderness of a solid round rod, hinged at both ends.
 *
 * Formula: λ = L / (d/4).
 * @param lengthMm L, mm @param diameterMm d, mm
 * @returns a bare number
 * Source: radius of gyration of a circle (reference entry B07).
 * @example roundSlenderness(250, 8) // 125
 */
export function roundSlenderness(lengthMm: number, diameterMm: number): Outcome<number> {
	if (!(lengthMm > 0) || !(diameterMm > 0))
		return cannot('length and diameter are numbers above zero');
	return computedNumber((4 * lengthMm) / diameterMm);
}
