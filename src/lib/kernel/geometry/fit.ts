import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

export type Range = { leastMm: number; mostMm: number };

/**
 * Clearance between an outer and an inner size, from readings or from printed limits: a piston in
 * its bore, a stem in its guide, a ring in its groove. Below zero is an interference.
 *
 * Formula: least = smallest outer − largest inner; most = largest outer − smallest inner.
 * @param outer, inner mm, above zero, least first
 * @returns mm
 * Source: definition of limits and fits, ISO 286-1; stem to guide as reference entries G15 and G16.
 * @example fitOf({ leastMm: 74, mostMm: 74.02 }, { leastMm: 73.96, mostMm: 73.975 }) // 0.025 to 0.060
 */
export function fitOf(outer: Range, inner: Range): Outcome<Range> {
	for (const one of [outer, inner]) {
		if (!(one.leastMm > 0) || !(one.mostMm < 1e5)) return cannot('a size is a number above zero');
		if (one.mostMm < one.leastMm) return cannot('the least size lies above the most');
	}
	return computed({
		leastMm: tidy(outer.leastMm - inner.mostMm),
		mostMm: tidy(outer.mostMm - inner.leastMm)
	});
}

/**
 * Oil clearance from housing, shell walls and pin, before anything is bolted together.
 *
 * Formula: C = H − 2 · w − D.
 * @param housingMm bore without shells, mm @param wallMm shell at its crown, mm @param pinMm mm
 * @returns mm; below zero is an interference
 * Source: definition; common practice, no source.
 * @example clearanceFromShellsMm(43, 1.489, 39.99) // 0.032
 */
export function clearanceFromShellsMm(
	housingMm: number,
	wallMm: number,
	pinMm: number
): Outcome<number> {
	if (![housingMm, wallMm, pinMm].every((one) => one > 0 && one < 1e5))
		return cannot('housing, wall and pin are numbers above zero');
	if (2 * wallMm >= housingMm) return cannot('the shells are thicker than their housing');
	return computed(tidy(housingMm - 2 * wallMm - pinMm));
}

/**
 * Oil clearance by the rule of thumb of a thousandth of the journal.
 *
 * Formula: C = 0.001 · D.
 * @param diameterMm journal D, mm
 * @returns mm: something to be surprised against, never a limit
 * Source: rule of thumb, reference entry G06 of the published exercises.
 * @example usualOilClearanceMm(60) // 0.06
 */
export function usualOilClearanceMm(diameterMm: number): Outcome<number> {
	return ofDiameter(0.001, diameterMm);
}

/**
 * A limit that a manual prints per unit of diameter or span.
 *
 * Formula: limit = k · D.
 * @param perUnit k, the same unit above and below, above zero @param diameterMm D, mm
 * @returns mm
 * Source: form of the limits in reference entries G18 and G20.
 * @example ofDiameter(0.0004, 63.5) // 0.0254
 */
export function ofDiameter(perUnit: number, diameterMm: number): Outcome<number> {
	if (!(perUnit > 0) || !(diameterMm > 0) || !(perUnit * diameterMm < 1e5))
		return cannot('a share and a size are numbers above zero');
	return computed(perUnit * diameterMm);
}
