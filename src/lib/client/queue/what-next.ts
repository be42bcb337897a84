import type { Answer } from '../api/call';

/** What the queue does after an answer. Only "saved" and "over" let go of a response. */
export type Next =
	| 'saved'
	| 'other-device' // a newer opening elsewhere; the line stops
	| 'over' // the sitting has ended; nothing more can be taken
	| 'refused' // this one's own fault: set aside and shown, the line goes on
	| 'offline'
	| 'signed-out'
	| 'again'; // the server is there and cannot just now

export function whatNext(answer: Answer<{ verdict: string }>): Next {
	if (answer.kind === 'done')
		return answer.value.verdict === 'other-epoch' ? 'other-device' : 'saved';
	if (answer.kind !== 'problem') return answer.kind;
	if (answer.status === 410) return 'over';
	return worksLater(answer.status) ? 'again' : 'refused';
}

/** A fault that passes: timeouts, too many at once, and whatever went wrong inside the server. */
export function worksLater(status: number): boolean {
	return status === 408 || status === 425 || status === 429 || status >= 500;
}

/** One second, doubled with each failure, half a minute at most: reception comes and goes. */
export function backoffMs(failures: number): number {
	return Math.min(30_000, 1000 * 2 ** Math.min(failures, 10));
}
