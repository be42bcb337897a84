import { cannot, computed, type Outcome } from '../outcome';
import { referenceC, type Body } from '../geometry/temperature';
import type { Component } from './component';

/** Half the width of a rectangular distribution over its standard uncertainty. */
const rectangular = Math.sqrt(3);

/**
 * Standard uncertainty from an instrument's least count: the true value lies anywhere within half
 * a count of what is read.
 *
 * Formula: u = δ / √12.
 * @param leastCount δ, above zero
 * @returns in its unit
 * @throws RangeError on misuse
 * Source: JCGM 100:2008 (GUM), F.2.2.1.
 * @example ofLeastCount(0.01) // 0.00289
 */
export function ofLeastCount(leastCount: number): number {
	if (!(leastCount > 0) || !Number.isFinite(leastCount))
		throw new RangeError('a least count is above zero');
	return leastCount / (2 * rectangular);
}

/**
 * Standard uncertainty of limits that a value is known to keep, with nothing known inside them.
 *
 * Formula: u = a / √3.
 * @param halfWidth a, zero or more
 * @returns in its unit
 * @throws RangeError on misuse
 * Source: JCGM 100:2008 (GUM), 4.3.7.
 * @example ofHalfWidth(2) // 1.155
 */
export function ofHalfWidth(halfWidth: number): number {
	if (!(halfWidth >= 0) || !Number.isFinite(halfWidth))
		throw new RangeError('a half width is a number, zero or more');
	return halfWidth / rectangular;
}

/** A body whose temperature and expansion are known to within these half widths. */
export type UncertainBody = Body & { temperatureWithinC: number; expansionWithinPerK: number };

/**
 * What temperature adds to the uncertainty of a size brought to 20 °C.
 *
 * Formula: L20 = L (1 + αs (Ts − 20) − αp (Tp − 20)); sensitivities L αs and −L αp to the
 * temperatures, L (Ts − 20) and −L (Tp − 20) to the expansions; each u = a / √3.
 * @param lengthMm size L @param part, instrument expansion 1/K, temperature °C, and how far off
 * each may be
 * @returns four components in mm, of which those known exactly are left out; "cannot" where a
 * figure makes no sense
 * Source: JCGM 100:2008 (GUM), H.1.3 in its idea; derivatives of the correction to ISO 1:2022.
 * @example temperatureComponents(80, { expansionPerK: 11e-6, temperatureC: 30,
 *   temperatureWithinC: 2, expansionWithinPerK: 1e-6 }, { expansionPerK: 11.5e-6,
 *   temperatureC: 20, temperatureWithinC: 2, expansionWithinPerK: 0 })
 *   // part temperature 0.00102 mm, part expansion 0.00046, instrument temperature 0.00106
 */
export function temperatureComponents(
	lengthMm: number,
	part: UncertainBody,
	instrument: UncertainBody
): Outcome<Component[]> {
	if (!(lengthMm > 0) || !Number.isFinite(lengthMm)) return cannot('a size is a number above zero');
	for (const { expansionPerK, temperatureC, temperatureWithinC, expansionWithinPerK } of [
		part,
		instrument
	])
		if (
			![expansionPerK, temperatureC].every(Number.isFinite) ||
			![temperatureWithinC, expansionWithinPerK].every((one) => one >= 0 && Number.isFinite(one))
		)
			return cannot('a temperature or an expansion is no number');
	const of = (who: string, sign: number, body: UncertainBody) => [
		known(
			`Temperature of the ${who}`,
			sign * lengthMm * body.expansionPerK,
			body.temperatureWithinC
		),
		known(
			`Expansion of the ${who}`,
			sign * lengthMm * (body.temperatureC - referenceC),
			body.expansionWithinPerK
		)
	];
	return computed(
		[...of('part', -1, part), ...of('instrument', 1, instrument)].filter(
			({ standard }) => standard > 0
		)
	);
}

function known(name: string, sensitivity: number, halfWidth: number): Component {
	return {
		name,
		type: 'B',
		standard: ofHalfWidth(halfWidth),
		sensitivity,
		degreesOfFreedom: Infinity
	};
}
