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

/**
 * xoshiro128** 1.1 (Blackman and Vigna, public domain, prng.di.unimi.it), its state filled from
 * the seed by FNV-1a (Fowler, Noll, Vo) and SplitMix32. Good for drawing questions and demo data;
 * never for secrets.
 *
 * @param seed any text; equal texts give equal draws
 * @example seeded('a').unit() === seeded('a').unit() // true
 */
export function seeded(seed: string): Random {
	const state = stateFrom(seed);
	const unit = () => next(state) / 2 ** 32;
	const integer = (least: number, most: number) => {
		if (!Number.isSafeInteger(least) || !Number.isSafeInteger(most) || most < least)
			throw new RangeError('integer(least, most) takes whole numbers, least first');
		return least + Math.floor(unit() * (most - least + 1));
	};
	return {
		unit,
		integer,
		between(least, most) {
			if (!(most >= least)) throw new RangeError('between(least, most), least first');
			return least + unit() * (most - least);
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

type State = [number, number, number, number];

function next(s: State): number {
	const result = Math.imul(rotate(Math.imul(s[1], 5), 7), 9) >>> 0;
	const t = s[1] << 9;
	s[2] ^= s[0];
	s[3] ^= s[1];
	s[1] ^= s[2];
	s[0] ^= s[3];
	s[2] ^= t;
	s[3] = rotate(s[3], 11);
	return result;
}

function rotate(x: number, bits: number): number {
	return (x << bits) | (x >>> (32 - bits));
}

function stateFrom(seed: string): State {
	let h = 0x811c9dc5;
	for (const byte of new TextEncoder().encode(seed)) h = Math.imul(h ^ byte, 0x01000193);
	const split = () => {
		h = (h + 0x9e3779b9) | 0;
		let z = Math.imul(h ^ (h >>> 16), 0x21f0aaad);
		z = Math.imul(z ^ (z >>> 15), 0x735a2d97);
		return z ^ (z >>> 15);
	};
	return [split(), split(), split(), split() || 1];
}
