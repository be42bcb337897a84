import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';
import { growthApartMm, growthFault, type Growth } from './temperature';

/**
 * A clearance with both parts warm, from the one at 20 °C: of a piston in its bore, a stem in its
 * guide. Below zero the parts would press on each other.
 *
 * Formula: C = C20 + L · (αo · ΔTo − αi · ΔTi).
 * @param coldMm clearance at 20 °C, mm @param lengthMm common size L, mm
 * @param outer, inner expansion 1/K, rise from 20 °C in K
 * @returns mm
 * Source: definition of linear expansion, first order.
 * @example warmClearanceMm(0.06, 80, { expansionPerK: 10.8e-6, riseK: 60 },
 *   { expansionPerK: 20e-6, riseK: 60 }) // 0.0158
 */
export function warmClearanceMm(
	coldMm: number,
	lengthMm: number,
	outer: Growth,
	inner: Growth
): Outcome<number> {
	const apart = growthApartMm(lengthMm, outer, inner);
	return apart.ok ? computedNumber(coldMm + apart.value) : apart;
}

/**
 * How far heat closes the gap of a ring in its bore: what its length grows more than the bore's
 * circumference.
 *
 * Formula: Δg = π · D · (αr · ΔTr − αb · ΔTb).
 * @param boreMm bore D, mm @param ring, bore expansion 1/K, rise from 20 °C in K
 * @returns mm; below zero where the gap opens
 * Source: definition of linear expansion, first order.
 * @example gapClosedMm(86, { expansionPerK: 10.8e-6, riseK: 150 },
 *   { expansionPerK: 10.8e-6, riseK: 80 }) // 0.204
 */
export function gapClosedMm(boreMm: number, ring: Growth, bore: Growth): Outcome<number> {
	const apart = growthApartMm(boreMm, ring, bore);
	return apart.ok ? computedNumber(Math.PI * apart.value) : apart;
}

/**
 * How much warmer a body must be to have grown by so much: a housing before a bearing drops in.
 *
 * Formula: ΔT = g / (L · α).
 * @param growthMm g, mm, zero or more @param lengthMm L, mm, above zero
 * @param expansionPerK α, 1/K, above zero
 * @returns K
 * Source: definition of linear expansion, first order.
 * @example riseToGrowK(0.06, 62, 23e-6) // 42.1
 */
export function riseToGrowK(
	growthMm: number,
	lengthMm: number,
	expansionPerK: number
): Outcome<number> {
	if (!(growthMm >= 0) || !(lengthMm > 0))
		return cannot('a growth is zero or more, a size above zero');
	const fault = growthFault({ expansionPerK, riseK: 0 });
	if (fault || expansionPerK === 0) return cannot(fault ?? 'what does not expand never grows');
	return computedNumber(growthMm / (lengthMm * expansionPerK));
}
