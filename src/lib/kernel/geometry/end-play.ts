import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

/**
 * End float of a shaft from a dial on its end, pushed one way and then the other.
 *
 * Formula: float = reading pushed away − reading pushed to, without its sign.
 * @param towardsMm, awayMm dial readings, mm
 * @returns mm
 * Source: method as in US Army manuals (dial indicator on the shaft's end).
 * @example endFloatMm(0.02, 0.17) // 0.15
 */
export function endFloatMm(towardsMm: number, awayMm: number): Outcome<number> {
	if (![towardsMm, awayMm].every((one) => Math.abs(one) <= 1000))
		return cannot('a dial reading is a number in millimetres');
	return computed(tidy(Math.abs(awayMm - towardsMm)));
}

/**
 * How much a ring's gap opens when its bore is larger.
 *
 * Formula: Δg = π · ΔD.
 * @param widerMm ΔD: how much larger the bore is than where the gap was measured, mm
 * @returns mm; below zero in a smaller bore
 * Source: circumference; the manuals round π to 3 (reference entries G09 and G10).
 * @example ringGapGrowthMm(0.05) // 0.157
 */
export function ringGapGrowthMm(widerMm: number): Outcome<number> {
	if (!(Math.abs(widerMm) <= 1e4))
		return cannot('a difference of bores is a number in millimetres');
	return computed(tidy(Math.PI * widerMm));
}

/**
 * How wide a ring's gap stands where its bore is larger.
 *
 * Formula: g = g0 + π · ΔD.
 * @param gapMm g0: the gap where it was measured, mm, zero or more
 * @param widerMm ΔD: how much larger the bore is than there, mm, below zero where it is smaller
 * @returns mm; "cannot" where the ring's ends would meet
 * Source: circumference; the manuals round π to 3 (reference entries G09 and G10).
 * @example ringGapInMm(0.3, 0.05) // 0.457
 */
export function ringGapInMm(gapMm: number, widerMm: number): Outcome<number> {
	if (!(gapMm >= 0) || gapMm > 100) return cannot('a gap is a number, zero or more');
	const growth = ringGapGrowthMm(widerMm);
	if (!growth.ok) return growth;
	const there = tidy(gapMm + growth.value);
	return there > 0 ? computed(there) : cannot('the ends of the ring would meet in so small a bore');
}

export type Deck = { heightMm: number; rockMm: number };

/**
 * Height of a piston at top dead centre against the deck, from the dial over both ends of the pin axis.
 *
 * Formula: height = mean of the readings; rock = largest − smallest.
 * @param readMm dial readings on the crown with the deck as zero, mm: above zero stands proud of the
 *   deck, below zero lies under it; at least two, at both ends of the pin axis, where rocking cancels
 * @returns mm
 * Source: method of the trade: two places along the pin, mean taken; common practice, no source.
 * @example deckHeight([0.42, 0.46]) // 0.44 proud, rock 0.04
 */
export function deckHeight(readMm: readonly number[]): Outcome<Deck> {
	if (readMm.length < 2) return cannot('read the crown at both ends of the pin axis');
	if (readMm.some((one) => !(Math.abs(one) <= 100)))
		return cannot('a dial reading is a number in millimetres');
	const mean = readMm.reduce((sum, one) => sum + one, 0) / readMm.length;
	return computed({
		heightMm: tidy(mean),
		rockMm: tidy(Math.max(...readMm) - Math.min(...readMm))
	});
}
