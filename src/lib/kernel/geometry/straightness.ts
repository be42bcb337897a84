import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';

/** Heights along a line: under a straight edge, a gap of 0.04 mm is a height of −0.04 mm. */
export type Profile = { atMm: readonly number[]; heightMm: readonly number[] };

export type Straightness = {
	widthMm: number;
	/** The three readings that hold it: the middle one lies `widthMm` off the line of the others. */
	held: readonly [number, number, number];
	/** What each of the three has in the width: the sum of weight times height. */
	weights: readonly [number, number, number];
};

const largestMm = 1e5;

/**
 * How far a line of readings departs from straight, overall or within any stretch of a given
 * length: the two parallel lines that lie closest together with the readings between them. Exact:
 * three readings hold them, so every three within the stretch are looked at. A stretch slides
 * along the places that were read; what lies between them nobody knows.
 *
 * Formula: largest |z2 − (z1 + (z3 − z1) · (x2 − x1) / (x3 − x1))| of three readings x1 < x2 < x3
 * with x3 − x1 ≤ the stretch.
 * @param profile mm, at least three readings, places growing
 * @param withinMm length of the stretch, mm, above zero; left out for the whole line
 * @returns mm, with the three readings; "cannot" where no three lie within the stretch
 * Source: ISO 12780-1:2011, minimum zone reference lines.
 * @example straightness({ atMm: [0, 50, 100], heightMm: [0, -0.04, 0] }) // 0.04
 */
export function straightness(
	{ atMm, heightMm }: Profile,
	withinMm = Infinity
): Outcome<Straightness> {
	if (!(withinMm > 0)) return cannot('a stretch is a length above zero');
	if (atMm.length !== heightMm.length) return cannot('each place has one reading');
	if ([...atMm, ...heightMm].some((one) => !(Math.abs(one) <= largestMm)))
		return cannot('each reading has a place and a height in millimetres');
	if (atMm.some((one, at) => at > 0 && one <= (atMm[at - 1] ?? one)))
		return cannot('the places along the line grow from one reading to the next');
	let best: Straightness | undefined;
	for (const [first, from] of atMm.entries())
		for (let last = first + 2; last < atMm.length; last++) {
			const length = (atMm[last] ?? 0) - from;
			// A stretch of 100 mm holds readings at 30.1 and 130.1 mm, whatever binary makes of them.
			if (length > withinMm + 1e-9) break;
			for (let middle = first + 1; middle < last; middle++) {
				const [a = 0, b = 0, c = 0] = [heightMm[first], heightMm[middle], heightMm[last]];
				const part = ((atMm[middle] ?? 0) - from) / length;
				const off = b - (a + (c - a) * part);
				const widthMm = tidy(Math.abs(off));
				const side = off < 0 ? -1 : 1;
				if (!best || widthMm > best.widthMm)
					best = {
						widthMm,
						held: [first, middle, last],
						weights: [side * (part - 1), side, -side * part]
					};
			}
		}
	if (best) return computed(best);
	return atMm.length < 3
		? cannot('two readings always lie in a line: take at least three')
		: cannot(`no three readings lie within ${tidy(withinMm)} mm: read at closer places`);
}
