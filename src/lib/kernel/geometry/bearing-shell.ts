import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

/** Of one half shell, and the press in diameter that both give; below zero the shell is loose. */
export type Crush = { crushMm: number; interferenceMm: number };

/**
 * Crush: how far each half shell stands proud of its half of the housing, and the press that both give.
 *
 * Formula: crush = s − π · H/2; interference in diameter = 2 · crush / π.
 * @param peripheralMm length s of one half shell around its back, mm @param housingMm bore H, mm
 * @returns crush of one half and interference in diameter, mm; below zero the shell is loose
 * Source: geometry of a half circle; crush as US Army TM 5-3805-255-14, bearing fitting, describes it.
 * @example crushOf(67.574, 43) // crush 0.030 mm
 */
export function crushOf(peripheralMm: number, housingMm: number): Outcome<Crush> {
	if (
		!(peripheralMm > 0) ||
		!(housingMm > 0) ||
		![peripheralMm, housingMm].every((one) => one < 1e5)
	)
		return cannot('length and housing are numbers above zero');
	const crush = peripheralMm - (Math.PI * housingMm) / 2;
	if (Math.abs(crush) > housingMm / 20)
		return cannot('that is no half shell of this housing: look at both figures');
	return computed({ crushMm: tidy(crush), interferenceMm: tidy((2 * crush) / Math.PI) });
}

/**
 * Crush from the gap at the split: both bolts tightened through every stage, then one of them
 * loosened until the joint opens.
 *
 * Formula: crush of one half = g / 2; interference in diameter = g / π.
 * @param gapMm g: gap at the loosened joint, mm, zero to 2
 * @returns mm
 * Source: method of the trade, common practice; the press follows from the circumference.
 * @example crushFromGap(0.06) // crush 0.030 mm, interference 0.019 mm
 */
export function crushFromGap(gapMm: number): Outcome<Crush> {
	if (!(gapMm >= 0) || gapMm > 2) return cannot('a gap at the split is zero to 2 mm');
	return computed({ crushMm: tidy(gapMm / 2), interferenceMm: tidy(gapMm / Math.PI) });
}

/**
 * Free spread: how much wider a half shell stands across its faces than its housing; it holds the
 * shell in place while the cap is off.
 *
 * Formula: spread = w − H.
 * @param widthMm across the joint faces, free, mm @param housingMm bore H, mm
 * @returns mm; zero or less: the shell falls out and is not fitted
 * Source: definition; US Army TM 5-3805-255-14, bearing fitting, step 6.
 * @example freeSpreadMm(43.6, 43) // 0.6
 */
export function freeSpreadMm(widthMm: number, housingMm: number): Outcome<number> {
	if (!(widthMm > 0) || !(housingMm > 0) || ![widthMm, housingMm].every((one) => one < 1e5))
		return cannot('width and housing are numbers above zero');
	return computed(tidy(widthMm - housingMm));
}
