import { cannot, computed, type Outcome } from '../outcome';

/** Gaps under a straight edge, mm, a row for each way it is laid; null where there is no metal. */
export type Gaps = readonly (readonly (number | null)[])[];

/**
 * The largest gap under a straight edge: what a workshop holds against a face's limit. Where the
 * edge rests on both ends of a hollow it is the departure from straight; where it rocks on a crown
 * it says more.
 *
 * Formula: largest gap = the thickest feeler that enters anywhere under the edge.
 * @param gaps mm, zero or more
 * @returns mm
 * Source: definition; common practice.
 * @example largestGapMm([[0, 0.04, 0.02]]) // 0.04
 */
export function largestGapMm(gaps: Gaps): Outcome<number> {
	const heights = heightsUnderEdge(gaps);
	if (!heights.ok) return heights;
	const taken = gaps.flat().filter((one) => one !== null);
	return taken.length > 0 ? computed(Math.max(...taken)) : cannot('no gap is read yet');
}

/** The face as seen from each straight edge: a gap is a height below it. */
export function heightsUnderEdge(gaps: Gaps): Outcome<(number | null)[][]> {
	if (gaps.flat().some((one) => one !== null && !(one >= 0 && one <= 100)))
		return cannot('a gap is the thickest feeler that enters, zero or more');
	return computed(gaps.map((row) => row.map((one) => (one === null ? null : 0 - one))));
}
