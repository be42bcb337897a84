const minuteMs = 60_000;

/** What is on its way when the clock runs out still counts; a phone's last request takes seconds. */
export const graceSeconds = 15;

/**
 * The instant after which nothing counts, computed once when the sitting begins and then stored.
 * @param extraShare extra time granted to this student, 0.25 for a quarter more
 */
export function deadlineOf(
	beganAtMs: number,
	timeLimitMinutes: number | null,
	extraShare = 0
): number | null {
	if (timeLimitMinutes === null) return null;
	if (extraShare < 0) throw new RangeError('extraShare');
	return beganAtMs + Math.ceil(timeLimitMinutes * (1 + extraShare) * minuteMs);
}

/** Arrival at the server decides, never the student's clock; the page says so. */
export function countsStill(arrivedAtMs: number, deadlineAtMs: number | null): boolean {
	return deadlineAtMs === null || arrivedAtMs <= deadlineAtMs + graceSeconds * 1000;
}

/** For the page's clock; the server's own time is what it starts from. */
export function leftMs(nowMs: number, deadlineAtMs: number | null): number | null {
	return deadlineAtMs === null ? null : Math.max(0, deadlineAtMs - nowMs);
}
