import { cannot, computed, type Outcome } from '../outcome';
import {
	clearanceForCm3,
	cylinderVolumes,
	type ClearanceParts,
	type Cylinder
} from './compression-ratio';
import { discHeightMm } from './disc-volume';

export type SolvedPart = 'chamberCm3' | 'gasketMm' | 'deckMm' | 'crownCm3';
export type Solved = {
	/** The part: cm³ for chamber and crown, mm for gasket and deck. */
	value: number;
	/** Swept volume, what the ratio leaves above the piston, what the others take of it, what is left; cm³. */
	sweptCm3: number;
	clearanceCm3: number;
	othersCm3: number;
	leftCm3: number;
	/** Over which a height was found from what is left. */
	diameterMm?: number;
};

/**
 * One part of a cylinder solved for a wanted ratio, the others as they are.
 *
 * Formula: part = Vs / (ε − 1) − all the others; a height = volume / (π/4 · D²).
 * @param cylinder bore and stroke, mm @param parts as they are; what stands for the part solved is not used
 * @param part which one @param ratio wanted ε, above 1
 * @returns the part with the volumes that lead to it; a crown below zero is a dome, a deck below
 *   zero stands proud; "cannot" where a chamber or a gasket would be less than nothing
 * Source: definition; reference entry D04.
 * @example solvePart({ boreMm: 86, strokeMm: 86 }, parts, 'crownCm3', 10.5) // dish or dome, cm³
 */
export function solvePart(
	cylinder: Cylinder,
	parts: ClearanceParts,
	part: SolvedPart,
	ratio: number
): Outcome<Solved> {
	const others = cylinderVolumes(cylinder, { ...parts, [part]: 0 });
	if (!others.ok) return others;
	const { sweptCm3, clearanceCm3: othersCm3 } = others.value;
	const wanted = clearanceForCm3(sweptCm3, ratio);
	if (!wanted.ok) return wanted;
	const leftCm3 = wanted.value - othersCm3;
	if (!Number.isFinite(leftCm3)) return cannot('the volumes are out of all proportion');
	const volumes = { sweptCm3, clearanceCm3: wanted.value, othersCm3, leftCm3 };
	if (part === 'crownCm3') return computed({ value: leftCm3, ...volumes });
	if (part !== 'deckMm' && leftCm3 < 0)
		return cannot('the other parts already hold more than the wanted ratio leaves room for');
	if (part === 'chamberCm3') return computed({ value: leftCm3, ...volumes });
	const diameterMm = part === 'gasketMm' ? parts.gasketBoreMm : cylinder.boreMm;
	const height = discHeightMm(leftCm3, diameterMm);
	return height.ok ? computed({ value: height.value, ...volumes, diameterMm }) : height;
}
