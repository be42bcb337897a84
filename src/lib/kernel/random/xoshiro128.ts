export type State = [number, number, number, number];

/**
 * One step of xoshiro128**: changes the state, gives 32 bits.
 *
 * @param s four 32-bit words, not all zero
 * @returns a whole number from 0 to 2³² − 1
 * Source: version 1.1, David Blackman and Sebastiano Vigna, public domain, prng.di.unimi.it.
 * @example nextXoshiro128([1, 2, 3, 4]) // 11520
 */
export function nextXoshiro128(s: State): number {
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

/**
 * Four words of state from any text: FNV-1a (32 bit) of its UTF-8 bytes, spread by SplitMix32.
 * Source: Fowler, Noll and Vo, FNV-1a; SplitMix32 with the multipliers 0x21f0aaad and 0x735a2d97.
 */
export function stateFrom(seed: string): State {
	let h = 0x811c9dc5;
	for (const byte of new TextEncoder().encode(seed)) h = Math.imul(h ^ byte, 0x01000193);
	const split = () => {
		h = (h + 0x9e3779b9) | 0;
		let z = Math.imul(h ^ (h >>> 16), 0x21f0aaad);
		z = Math.imul(z ^ (z >>> 15), 0x735a2d97);
		return z ^ (z >>> 15);
	};
	// The one state that xoshiro cannot leave is all zero.
	return [split(), split(), split(), split() || 1];
}

function rotate(x: number, bits: number): number {
	return (x << bits) | (x >>> (32 - bits));
}
