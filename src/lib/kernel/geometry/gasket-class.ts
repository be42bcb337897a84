import { cannot, computed, type Outcome } from '../outcome';

/** A gasket with the heights of the highest piston that it is made for. */
export type GasketClass = { name: string; leastMm: number; mostMm: number };

/**
 * Which gasket the pistons call for: the highest one decides for the whole head.
 *
 * @param heightsMm height of each piston at top dead centre, above zero proud of the deck, mm
 * @param classes as printed, least and most both belonging to the class
 * @returns the class and the piston that decides, counted from 0; "cannot" where no class holds it
 * Source: method of diesel service manuals (one gasket, chosen by the highest piston); common
 * practice, no source.
 * @example gasketFor([0.42, 0.47], [{ name: '1 notch', leastMm: 0.4, mostMm: 0.5 }]) // 1 notch, piston 1
 */
export function gasketFor(
	heightsMm: readonly number[],
	classes: readonly GasketClass[]
): Outcome<{ name: string; decidedBy: number }> {
	if (heightsMm.length === 0 || heightsMm.some((one) => !(Math.abs(one) <= 100)))
		return cannot('the height of each piston is a number in millimetres');
	if (classes.length === 0) return cannot('no class of gasket is listed');
	if (classes.some(({ leastMm, mostMm }) => !(mostMm >= leastMm)))
		return cannot('a class runs from its least to its most');
	const highest = Math.max(...heightsMm);
	// Heights are rounded to the nanometre: dust must not push one out of its class.
	const found = classes.find(
		({ leastMm, mostMm }) => highest >= leastMm - 1e-9 && highest <= mostMm + 1e-9
	);
	return found
		? computed({ name: found.name, decidedBy: heightsMm.indexOf(highest) })
		: cannot('the highest piston lies in none of the listed classes');
}
