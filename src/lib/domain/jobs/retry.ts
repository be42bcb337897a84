const minuteMs = 60_000;
/** About two days in all: long enough for a mail server to come back from a weekend's trouble. */
const waitsMs = [0.1, 0.5, 2, 10, 30, 60, 180, 360, 720, 1440].map((minutes) => minutes * minuteMs);

/** @returns how long to wait after this many attempts, or undefined when it is time to give up */
export function retryAfterMs(attempts: number): number | undefined {
	return waitsMs[attempts - 1];
}
