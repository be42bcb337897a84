import { nextXoshiro128, stateFrom } from './xoshiro128';

/** Chance that can be had again: the same seed gives the same draws on every machine. */
export type Random = {
	/** In [0, 1), with 32 bits. */
	unit(): number;
	/** In [least, most). */
	between(least: number, most: number): number;
	/** A whole number in [least, most], both included. */
	integer(least: number, most: number): number;
	pick<T>(list: readonly T[]): T;
	/** A new list; the one given stays as it is. */
	shuffle<T>(list: readonly T[]): T[];
};

const words = 2 ** 32;

/**
 * Draws from a seed by xoshiro128**. Good for drawing questions and demo data; never for secrets.
 * A sitting stores its seed and is drawn again when it is scored: what a seed gives must not
 * change, and the tests hold its first draws.
 *
 * @param seed any text; equal texts give equal draws
 * @example seeded('a').unit() === seeded('a').unit() // true
 */
export function seeded(seed: string): Random {
	const state = stateFrom(seed);
	const unit = () => nextXoshiro128(state) / words;
	const integer = (least: number, most: number) => {
		if (!Number.isSafeInteger(least) || !Number.isSafeInteger(most) || most < least)
			throw new RangeError('integer(least, most) takes whole numbers, least first');
		if (most - least >= words) throw new RangeError('integer(least, most) spans at most 32 bits');
		return least + Math.floor(unit() * (most - least + 1));
	};
	return {
		unit,
		integer,
		between(least, most) {
			if (!(most >= least) || !Number.isFinite(most - least))
				throw new RangeError('between(least, most), least first');
			// Rounding may reach the upper end of a narrow span, which is not included.
			const value = least + unit() * (most - least);
			return value < most ? value : least;
		},
		pick(list) {
			if (list.length === 0) throw new RangeError('nothing to pick from');
			return list[integer(0, list.length - 1)] as (typeof list)[number];
		},
		shuffle(list) {
			const out = [...list];
			// Fisher and Yates, from the end.
			for (let i = out.length - 1; i > 0; i--) {
				const j = integer(0, i);
				[out[i], out[j]] = [out[j] as (typeof out)[number], out[i] as (typeof out)[number]];
			}
			return out;
		}
	};
}
