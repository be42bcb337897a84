import { coverage, gaps, mergeIntervals, type Interval } from '$lib/kernel/captions/watched';

/** The share of a film that counts as watched: leaves room for titles and rounding, not for skipping. */
export const leastShare = 0.9;

/** Whether a film was really watched, and if not, what is still to be seen. */
export function filmWatched(
	intervals: readonly Interval[],
	lengthS: number
): { ok: true } | { ok: false; because: string } {
	const merged = mergeIntervals(intervals);
	if (coverage(merged, lengthS) >= leastShare) return { ok: true };
	const unseen = gaps(merged, lengthS)
		.slice(0, 4)
		.map(([from, to]) => `${clock(from)}–${clock(to)}`);
	return { ok: false, because: `Watch the film first. Not yet seen: ${unseen.join(', ')}.` };
}

/** "2:05" */
export function clock(seconds: number): string {
	const whole = Math.floor(seconds);
	return `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, '0')}`;
}
