import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';
import { stressAreaMm2 } from './stress-area';
import { threadOf } from './thread';

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
	const thread = threadOf(diameterMm, pitchMm);
	if (!thread.ok) return thread;
	const area = stressAreaMm2(diameterMm, pitchMm);
	if (!area.ok) return area;
	if (!(yieldMPa > 0)) return cannot('a yield strength is a number above zero');
	if (!(threadFriction >= 0) || threadFriction > 1)
		return cannot('a friction coefficient lies between 0 and 1');
	if (!(share > 0) || share > 1) return cannot('a share of yield lies above 0 and up to 1');
	const { pitchDiameterMm: d2, rootDiameterMm: d3 } = thread.value;
	const twist = 1.5 * (d2 / ((d2 + d3) / 2)) * (pitchMm / (Math.PI * d2) + 1.155 * threadFriction);
	return computedNumber((share * yieldMPa * area.value) / Math.sqrt(1 + 3 * twist ** 2));
}
