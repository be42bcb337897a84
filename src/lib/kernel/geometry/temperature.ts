import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/** Linear expansion a kelvin, such as 11.5e-6 for steel, and degrees away from 20 °C. */
export type Growth = { expansionPerK: number; riseK: number };
export type Body = { expansionPerK: number; temperatureC: number };

/** The temperature at which sizes are printed. Source: ISO 1:2022. */
export const referenceC = 20;

/**
 * How much a length has grown since 20 °C.
 *
 * Formula: ΔL = L · α · ΔT.
 * @param lengthMm L, mm, above zero @param growth expansion 1/K, rise from 20 °C in K
 * @returns mm; below zero where it is colder
 * Source: definition of linear expansion, first order.
 * @example growthMm(74, { expansionPerK: 23e-6, riseK: 15 }) // 0.0255
 */
export function growthMm(lengthMm: number, growth: Growth): Outcome<number> {
	return growthApartMm(lengthMm, growth, { expansionPerK: 0, riseK: 0 });
}

/**
 * How much more the outer of two bodies of one size has grown than the inner.
 *
 * Formula: Δ = L · (αo · ΔTo − αi · ΔTi).
 * @param lengthMm common size L, mm @param outer, inner expansion 1/K, rise from 20 °C in K
 * @returns mm; below zero where the inner has grown more
 * Source: definition of linear expansion, first order.
 * @example growthApartMm(80, { expansionPerK: 10.8e-6, riseK: 60 },
 *   { expansionPerK: 20e-6, riseK: 60 }) // -0.0442
 */
export function growthApartMm(lengthMm: number, outer: Growth, inner: Growth): Outcome<number> {
	if (!(lengthMm > 0)) return cannot('a size is a number above zero');
	const fault = growthFault(outer) ?? growthFault(inner);
	if (fault) return cannot(fault);
	return computedNumber(
		lengthMm * (outer.expansionPerK * outer.riseK - inner.expansionPerK * inner.riseK)
	);
}

/**
 * A reading brought to 20 °C, part minus instrument: a warm part has grown, a warm scale reads
 * short.
 *
 * Formula: L20 = L · (1 + αs · (Ts − 20) − αp · (Tp − 20)).
 * @param readMm reading, mm @param part, instrument expansion 1/K and temperature °C
 * @returns mm
 * Source: ISO 1:2022 (20 °C); first order in the expansions.
 * @example at20Mm(74.02, { expansionPerK: 10.8e-6, temperatureC: 35 },
 *   { expansionPerK: 11.5e-6, temperatureC: 20 }) // 74.008
 */
export function at20Mm(readMm: number, part: Body, instrument: Body): Outcome<number> {
	const apart = growthApartMm(readMm, growthOf(instrument), growthOf(part));
	return apart.ok ? computedNumber(readMm + apart.value) : apart;
}

/**
 * The other way: what an instrument of one temperature reads on a part of another whose size at
 * 20 °C is known, such as a printed limit on a warm day.
 *
 * Formula: L = L20 / (1 + αs · (Ts − 20) − αp · (Tp − 20)).
 * @param sizeAt20Mm mm @param part, instrument expansion 1/K and temperature °C
 * @returns mm
 * Source: ISO 1:2022 (20 °C); first order in the expansions.
 * @example readingOfMm(74.008, { expansionPerK: 10.8e-6, temperatureC: 35 },
 *   { expansionPerK: 11.5e-6, temperatureC: 20 }) // 74.020
 */
export function readingOfMm(sizeAt20Mm: number, part: Body, instrument: Body): Outcome<number> {
	const perMm = growthApartMm(1, growthOf(instrument), growthOf(part));
	if (!perMm.ok) return perMm;
	if (!(sizeAt20Mm > 0)) return cannot('a size is a number above zero');
	return computedNumber(sizeAt20Mm / (1 + perMm.value));
}

export function growthOf({ expansionPerK, temperatureC }: Body): Growth {
	return { expansionPerK, riseK: temperatureC - referenceC };
}

/** Why no sum can be made of this, if none can: beyond these a figure is a slip. */
export function growthFault({ expansionPerK, riseK }: Growth): string | undefined {
	if (!(expansionPerK >= 0 && expansionPerK <= 1e-3))
		return 'an expansion is a small number a kelvin, such as 0.0000115 for steel';
	if (!(Math.abs(riseK) <= 1000)) return 'a temperature lies within 1000 °C of 20 °C';
	return undefined;
}
