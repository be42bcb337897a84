/** A stretch of a film in seconds, from and to. */
export type Interval = readonly [number, number];

/** Players report a little early or late; a gap shorter than this was not skipped. */
const joinS = 0.5;

/**
 * Merges stretches into the fewest that cover the same, in order.
 *
 * @param intervals seconds; reversed or non-finite ones are refused
 * @throws RangeError where a stretch ends before it begins
 * Source: union of intervals by sweep; stretches nearer than 0.5 s are joined (own choice, the
 * resolution of a player's time reports).
 * @example mergeIntervals([[10, 20], [0, 5], [18, 30]]) // [[0, 5], [10, 30]]
 */
export function mergeIntervals(intervals: readonly Interval[]): [number, number][] {
	for (const [from, to] of intervals)
		if (!Number.isFinite(from) || !Number.isFinite(to) || from < 0 || to < from)
			throw new RangeError('a stretch has a beginning and a later end');
	const merged: [number, number][] = [];
	for (const [from, to] of [...intervals].sort((a, b) => a[0] - b[0])) {
		const last = merged.at(-1);
		if (last && from <= last[1] + joinS) last[1] = Math.max(last[1], to);
		else merged.push([from, to]);
	}
	return merged;
}

/** Seconds watched of merged stretches. @example watchedS([[0, 5], [10, 30]]) // 25 */
export function watchedS(merged: readonly Interval[]): number {
	return merged.reduce((sum, [from, to]) => sum + to - from, 0);
}

/**
 * The share of a film that was watched, 0 to 1; a film without length is all watched.
 *
 * @param merged from `mergeIntervals`; what lies past the end counts for nothing
 * @param lengthS seconds
 * @throws RangeError where the length is no number
 * @example coverage([[0, 50]], 100) // 0.5
 */
export function coverage(merged: readonly Interval[], lengthS: number): number {
	if (!Number.isFinite(lengthS)) throw new RangeError('a film has a length');
	if (lengthS <= 0) return 1;
	const inside = merged.map(([from, to]): Interval => [from, Math.min(to, lengthS)]);
	return Math.min(1, watchedS(inside.filter(([from, to]) => to > from)) / lengthS);
}

/**
 * What was not seen yet, longer than a second.
 * @example gaps([[0, 5], [10, 30]], 40) // [[5, 10], [30, 40]]
 */
export function gaps(merged: readonly Interval[], lengthS: number): [number, number][] {
	const out: [number, number][] = [];
	let at = 0;
	for (const [from, to] of merged.filter(([from]) => from < lengthS)) {
		if (from - at > 1) out.push([at, from]);
		at = Math.max(at, to);
	}
	if (lengthS - at > 1) out.push([at, lengthS]);
	return out;
}
