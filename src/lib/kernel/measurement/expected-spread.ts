import { cannot, computed, type Outcome } from '../outcome';
import { normalCdf } from '../statistics/distributions/normal';
import { integral } from './integrate';

/**
 * What largest minus smallest comes out as on average when each place is read with scatter: more
 * than the true difference, since the extremes gather the reading errors.
 *
 * Formula: E = ∫ (1 − Π Φ((x − mᵢ)/u) − Π Φ((mᵢ − x)/u)) dx.
 * @param sizes true sizes mᵢ at the places read, two or more @param standard u of one reading,
 * zero or more
 * @returns in their unit; for n equal sizes d2(n) · u
 * Source: expectation of the largest less that of the smallest of independent normal values;
 * H. A. David and H. N. Nagaraja, Order Statistics (2003), 3.1.
 * @example expectedSpread([40, 40], 0.003) // 0.0034
 */
export function expectedSpread(sizes: readonly number[], standard: number): Outcome<number> {
	if (sizes.length < 2) return cannot('a spread needs two readings');
	if (!sizes.every(Number.isFinite)) return cannot('a size is no number');
	if (!(standard >= 0) || !Number.isFinite(standard))
		return cannot('an uncertainty is a number, zero or more');
	const [least, most] = [Math.min(...sizes), Math.max(...sizes)];
	// In units of u and from the least size on, so that no figures are lost.
	const alike = new Map<number, number>();
	for (const one of sizes) {
		const m = (one - least) / standard;
		alike.set(m, (alike.get(m) ?? 0) + 1);
	}
	const width = (most - least) / standard;
	if (!Number.isFinite(width) || width > negligible) return computed(most - least);
	const beyond = (x: number) => {
		let [allBelow, allAbove] = [1, 1];
		for (const [m, times] of alike) {
			allBelow *= normalCdf(x - m) ** times;
			allAbove *= normalCdf(m - x) ** times;
		}
		return 1 - allBelow - allAbove;
	};
	const marks = [...alike.keys()].flatMap((m) => [-6, -4, -2, 0, 2, 4, 6].map((k) => m + k));
	return computed(standard * integral(beyond, -9, width + 9, marks));
}

/** A difference so much larger than u that the reading errors add less than a millionth to it. */
const negligible = 1e6;

/**
 * The true largest-minus-smallest that would show, on average, as the one read.
 *
 * Formula: δ with E(δ) = R, E the expected spread of sizes +δ/2, −δ/2 and n − 2 halfway; 0 where R
 * is no more than what n equal sizes show.
 * @param shown R, largest minus smallest as read @param n places read, whole, 2 to 100
 * @param standard u of one reading
 * @returns estimate and what the reading errors added, in the unit given
 * Source: as expectedSpread, solved for δ. An estimate under the stated shape; the ruling goes by
 * what was read.
 * @example trueSpread(0.012, 4, 0.003) // δ 0.0107, added 0.0013
 */
export function trueSpread(
	shown: number,
	n: number,
	standard: number
): Outcome<{ estimate: number; added: number }> {
	if (!(shown >= 0) || !Number.isFinite(shown)) return cannot('a spread is zero or more');
	if (!Number.isSafeInteger(n) || n < 2 || n > 100)
		return cannot('a spread is that of 2 to 100 readings');
	const showing = (spread: number) =>
		expectedSpread([-spread / 2, spread / 2, ...Array<number>(n - 2).fill(0)], standard);
	const equals = showing(0);
	if (!equals.ok) return equals;
	if (shown <= equals.value) return computed({ estimate: 0, added: shown });
	let [low, high] = [0, shown];
	for (let step = 0; step < 30; step++) {
		const middle = (low + high) / 2;
		const found = showing(middle);
		if (!found.ok) return found;
		if (found.value > shown) high = middle;
		else low = middle;
	}
	return computed({ estimate: low, added: shown - low });
}
