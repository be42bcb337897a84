import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';
import { stressAreaMm2 } from './stress-area';
import { threadOf } from './thread';

/**
 * What the torsion of tightening leaves of a bolt's strength while the wrench is on it.
 *
 * Formula: q = 1 / √(1 + 3 · (1.5 · d2/d0 · (P/(π · d2) + 1.155 µG))²), d0 the diameter that carries.
 * @param diameterMm d, mm @param pitchMm P, mm @param threadFriction µG, 0 to 1
 * @param carryingMm d0, mm, where a shank is thinner than the thread; else that of the stress area
 * @returns a share, above 0 and below 1
 * Source: VDI 2230 part 1, reduced stress at assembly.
 * @example strengthWhileTurned(10, 1.25, 0.12) // 0.897
 */
export function strengthWhileTurned(
	diameterMm: number,
	pitchMm: number,
	threadFriction: number,
	carryingMm?: number
): Outcome<number> {
	const thread = threadOf(diameterMm, pitchMm);
	if (!thread.ok) return thread;
	if (!(threadFriction >= 0) || threadFriction > 1)
		return cannot('a friction coefficient lies between 0 and 1');
	const { pitchDiameterMm: d2, rootDiameterMm: d3 } = thread.value;
	const carrying = carryingMm ?? (d2 + d3) / 2;
	if (!(carrying > 0)) return cannot('a diameter is a number above zero');
	const twist = 1.5 * (d2 / carrying) * (pitchMm / (Math.PI * d2) + 1.155 * threadFriction);
	return computedNumber(1 / Math.sqrt(1 + 3 * twist ** 2));
}

/**
 * Preload at which a bolt that is being turned reaches a share of its yield: the thread's torsion
 * takes part of its strength while the wrench is on it.
 *
 * Formula: F = ν · Re · As / √(1 + 3 · (1.5 · d2/d0 · (P/(π · d2) + 1.155 µG))²), d0 the diameter of As.
 * @param diameterMm d, mm @param pitchMm P, mm @param yieldMPa Re, N/mm²
 * @param threadFriction µG, 0 to 1 @param share ν of yield to use, above 0 up to 1; 0.9 is usual
 * @returns N
 * Source: VDI 2230 part 1, permissible assembly preload (reduced stress, 90 % of yield).
 * @example assemblyPreloadN(10, 1.25, 940, 0.12) // 46 400
 */
export function assemblyPreloadN(
	diameterMm: number,
	pitchMm: number,
	yieldMPa: number,
	threadFriction: number,
	share = 0.9
): Outcome<number> {
	const left = strengthWhileTurned(diameterMm, pitchMm, threadFriction);
	if (!left.ok) return left;
	const area = stressAreaMm2(diameterMm, pitchMm);
	if (!area.ok) return area;
	if (!(yieldMPa > 0)) return cannot('a yield strength is a number above zero');
	if (!(share > 0) || share > 1) return cannot('a share of yield lies above 0 and up to 1');
	return computedNumber(share * yieldMPa * area.value * left.value);
}
