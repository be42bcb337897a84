import { cannot, computed, type Outcome } from '../outcome';
import { clearanceFromShellsMm } from './fit';

export type ShellChoice = {
	/** Clearance that each wall gives, in the order given, mm. */
	clearancesMm: number[];
	/** The wall to fit, counted from 0; none where no clearance lies inside the limits. */
	chosen?: number;
};

/**
 * Which of several shell walls to fit: the one whose clearance lies inside its limits and nearest
 * their middle.
 *
 * Formula: C = H − 2 · w − D for each wall w; least |C − (least + most)/2| of those within.
 * @param housingMm bore without shells, mm @param pinMm mm @param wallsMm at the crown, mm
 * @param limits of the clearance, mm
 * @returns all clearances, and the choice where one lies inside the limits
 * Source: definition of the clearance; the choice nearest the middle is common practice, no source.
 * @example chooseShells(43, 39.99, [1.486, 1.489], { leastMm: 0.02, mostMm: 0.048 }) // 1.489: 0.032
 */
export function chooseShells(
	housingMm: number,
	pinMm: number,
	wallsMm: readonly number[],
	{ leastMm, mostMm }: { leastMm: number; mostMm: number }
): Outcome<ShellChoice> {
	if (!(leastMm >= 0) || !(mostMm >= leastMm) || !Number.isFinite(mostMm))
		return cannot('a clearance runs from its least to its most, zero or more');
	if (wallsMm.length === 0) return cannot('no shell is listed');
	const clearancesMm: number[] = [];
	for (const wallMm of wallsMm) {
		const one = clearanceFromShellsMm(housingMm, wallMm, pinMm);
		if (!one.ok) return one;
		clearancesMm.push(one.value);
	}
	const off = clearancesMm.map((one) =>
		one < leastMm - 1e-9 || one > mostMm + 1e-9 ? Infinity : Math.abs(one - (leastMm + mostMm) / 2)
	);
	const nearest = Math.min(...off);
	return computed({
		clearancesMm,
		...(nearest < Infinity ? { chosen: off.indexOf(nearest) } : {})
	});
}
