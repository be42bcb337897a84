import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Random } from '$lib/kernel/random/random';
import type { SheetFigure } from '../sheet-figures';

/** Rounds as an instrument would show it. */
export function shown(value: number, decimals: number): number {
	return Number(value.toFixed(decimals));
}

/** A step's value as it is shown; none where it cannot be worked. */
export function worked(found: Outcome<number>, decimals: number): { value?: number } {
	return found.ok ? { value: shown(found.value, decimals) } : {};
}

/**
 * The size of a part that has run: between its printed sizes and a little beyond its wear limit,
 * on the side that it wears to. Never anything that a bench could not show.
 */
export function drawWorn(figure: SheetFigure, random: Random): Outcome<number> {
	const { least, most, wearLimit, wearsBy, decimals } = figure;
	if (least === undefined || most === undefined)
		return cannot(`${figure.words} has no limits in the data sheet`);
	const room =
		wearLimit === undefined
			? most - least
			: Math.abs(wearLimit - (wearsBy === 'growing' ? most : least));
	const worn = random.between(0.1, 0.95) * room;
	const value = wearsBy === 'growing' ? most + worn : least - worn;
	return computed(shown(value, decimals));
}

/** Readings around one size, spread as wear spreads them, every one of them different from the next. */
export function drawAround(
	value: number,
	decimals: number,
	count: number,
	random: Random
): number[] {
	const step = 10 ** -decimals;
	const out = [value];
	while (out.length < count) {
		const next = shown(value + random.integer(-9, 9) * step, decimals);
		if (!out.includes(next)) out.push(next);
	}
	return random.shuffle(out);
}
