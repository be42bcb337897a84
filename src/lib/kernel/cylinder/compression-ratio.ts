import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import { discVolumeCm3 } from './disc-volume';
import { displacementCm3 } from './displacement';

/** What stands above a piston at top dead centre. */
export type ClearanceParts = {
	chamberCm3: number;
	gasketBoreMm: number;
	gasketMm: number;
	/** Piston below the deck, mm; below zero where it stands proud. */
	deckMm: number;
	/** Dish and valve reliefs less dome, cm³; below zero for a dome. */
	crownCm3: number;
	/** The ring of space above the top ring, cm³, where somebody has measured it. */
	creviceCm3?: number;
};
export type Cylinder = { boreMm: number; strokeMm: number };
export type Ratio = {
	ratio: number;
	sweptCm3: number;
	clearanceCm3: number;
	gasketCm3: number;
	deckCm3: number;
};

/**
 * Compression ratio from swept and clearance volume.
 *
 * Formula: ε = (Vs + Vc) / Vc.
 * @param sweptCm3 Vs, cm³ @param clearanceCm3 Vc, cm³, both above zero
 * @returns a bare ratio above 1
 * Source: definition; reference entry D03.
 * @example ratioOf(823.7, 100) // 9.237
 */
export function ratioOf(sweptCm3: number, clearanceCm3: number): Outcome<number> {
	if (!(sweptCm3 > 0) || !(clearanceCm3 > 0))
		return cannot('swept and clearance volume are numbers above zero');
	return computedNumber(1 + sweptCm3 / clearanceCm3);
}

/**
 * Clearance volume for a wanted ratio.
 *
 * Formula: Vc = Vs / (ε − 1).
 * @param sweptCm3 Vs, cm³ @param ratio ε, above 1
 * @returns cm³
 * Source: definition; also the liquid that just locks a cylinder (reference entries D13, D14).
 * @example clearanceForCm3(997.46, 16) // 66.5
 */
export function clearanceForCm3(sweptCm3: number, ratio: number): Outcome<number> {
	if (!(sweptCm3 > 0)) return cannot('a swept volume is a number above zero');
	if (!(ratio > 1)) return cannot('a compression ratio is above 1');
	return computedNumber(sweptCm3 / (ratio - 1));
}

/**
 * Compression ratio of a cylinder from its parts.
 *
 * Formula: Vc = chamber + gasket + deck + crown + crevice; ε = (Vs + Vc) / Vc.
 * @param cylinder bore and stroke, mm @param parts see the type
 * @returns the ratio with every volume, cm³; "cannot" where nothing is left above the piston
 * Source: definition; reference entries D16 to D18.
 * @example compressionRatio({ boreMm: 102.362, strokeMm: 88.392 }, { chamberCm3: 64,
 *   gasketBoreMm: 104.14, gasketMm: 1.0414, deckMm: 0.254, crownCm3: 5 }) // 10.1
 */
export function compressionRatio(cylinder: Cylinder, parts: ClearanceParts): Outcome<Ratio> {
	const volumes = cylinderVolumes(cylinder, parts);
	if (!volumes.ok) return volumes;
	if (!(volumes.value.clearanceCm3 > 0))
		return cannot('nothing is left above the piston: dome or deck fill the chamber');
	const ratio = ratioOf(volumes.value.sweptCm3, volumes.value.clearanceCm3);
	return ratio.ok ? computed({ ratio: ratio.value, ...volumes.value }) : ratio;
}

/** Every volume of a cylinder, cm³; their sum may come out below zero. */
export function cylinderVolumes(
	cylinder: Cylinder,
	parts: ClearanceParts
): Outcome<Omit<Ratio, 'ratio'>> {
	const { boreMm, strokeMm } = cylinder;
	if (!(boreMm > 0) || !(strokeMm > 0) || boreMm > 5000 || strokeMm > 5000)
		return cannot('bore and stroke are numbers above zero');
	const { chamberCm3, crownCm3, creviceCm3 = 0 } = parts;
	if (!(chamberCm3 >= 0) || !(creviceCm3 >= 0) || !(Math.abs(crownCm3) < 1e6))
		return cannot('chamber and crevice are volumes, zero or more');
	if (!(parts.gasketMm >= 0)) return cannot('a gasket is not thinner than nothing');
	if (parts.gasketBoreMm < boreMm)
		return cannot('the gasket’s bore is smaller than the cylinder: it would stand in the way');
	const gasket = discVolumeCm3(parts.gasketBoreMm, parts.gasketMm);
	if (!gasket.ok) return cannot(`gasket: ${gasket.because}`);
	const deck = discVolumeCm3(boreMm, parts.deckMm);
	if (!deck.ok) return cannot(`deck: ${deck.because}`);
	return computed({
		sweptCm3: displacementCm3(boreMm, strokeMm),
		clearanceCm3: chamberCm3 + gasket.value + deck.value + crownCm3 + creviceCm3,
		gasketCm3: gasket.value,
		deckCm3: deck.value
	});
}
