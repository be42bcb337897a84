import { computedNumber } from '../computed-number';
import { cannot, type Outcome } from '../outcome';

/** Crank centre to deck, and what stands in it; all in one unit of length. */
export type BlockStack = {
	blockHeight: number;
	/** Piston below the deck at top dead centre; below zero it stands proud. */
	deck: number;
	stroke: number;
};

/**
 * Rod length that a block, a piston and a stroke leave room for.
 *
 * Formula: L = H − deck − hk − S/2.
 * @param stack heights in one unit @param compressionHeight hk, pin centre to crown, same unit
 * @returns same unit; "cannot" where nothing is left for a rod
 * Source: geometry of the block; reference entry D07.
 * @example rodLength({ blockHeight: 9.025, deck: 0.025, stroke: 3.5 }, 1.0) // 6.25
 */
export function rodLength(stack: BlockStack, compressionHeight: number): Outcome<number> {
	return leftOf(stack, compressionHeight, 'rod');
}

/**
 * Compression height (pin centre to crown) that a block, a rod and a stroke leave room for.
 *
 * Formula: hk = H − deck − L − S/2.
 * @param stack heights in one unit @param rod L, centre to centre, same unit
 * @returns same unit; "cannot" where nothing is left for a piston
 * Source: geometry of the block; reference entry D08.
 * @example compressionHeight({ blockHeight: 9.025, deck: 0.025, stroke: 3.5 }, 6.0) // 1.25
 */
export function compressionHeight(stack: BlockStack, rod: number): Outcome<number> {
	return leftOf(stack, rod, 'piston');
}

/**
 * How far a piston stands below its block's deck at top dead centre.
 *
 * Formula: deck = H − hk − L − S/2.
 * @param parts block height H, compression height hk, rod L and stroke S, in one unit, above zero
 * @returns same unit; below zero it stands proud
 * Source: geometry of the block; reference entries D07 and D08.
 * @example pistonDeck({ blockHeight: 215, compressionHeight: 30.25, rod: 140, stroke: 89.1 }) // 0.2
 */
export function pistonDeck(parts: {
	blockHeight: number;
	compressionHeight: number;
	rod: number;
	stroke: number;
}): Outcome<number> {
	const { blockHeight, compressionHeight: height, rod, stroke } = parts;
	if (![blockHeight, height, rod, stroke].every((one) => one > 0))
		return cannot('block height, piston, rod and stroke are numbers above zero');
	return computedNumber(blockHeight - height - rod - stroke / 2);
}

/**
 * Room between the flat of a piston at top dead centre and the flat of its head.
 *
 * Formula: s = gasket + deck.
 * @param gasketMm fitted thickness, mm, zero or more @param deckMm piston below the deck, mm, with a sign
 * @returns mm; at zero or below they strike
 * Source: geometry of the block.
 * @example pistonToHeadMm(1.2, 0.2) // 1.4
 */
export function pistonToHeadMm(gasketMm: number, deckMm: number): Outcome<number> {
	if (!(gasketMm >= 0)) return cannot('a gasket is not thinner than nothing');
	return computedNumber(gasketMm + deckMm);
}

function leftOf(stack: BlockStack, taken: number, what: string): Outcome<number> {
	const { blockHeight, deck, stroke } = stack;
	if (!(blockHeight > 0) || !(stroke > 0) || !(taken > 0) || !Number.isFinite(deck))
		return cannot('block height, stroke and the other part are numbers above zero');
	const left = blockHeight - deck - taken - stroke / 2;
	return left > 0 ? computedNumber(left) : cannot(`nothing is left for the ${what} in that block`);
}
