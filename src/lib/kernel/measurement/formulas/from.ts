import type { Outcome } from '../../outcome';

/** One figure of a result, or why there is none. */
export function from<T, R>(outcome: Outcome<T>, pick: (value: T) => R | Outcome<R>): Outcome<R> {
	if (!outcome.ok) return outcome;
	const picked = pick(outcome.value);
	return isOutcome(picked) ? picked : { ok: true, value: picked };
}

function isOutcome<R>(picked: R | Outcome<R>): picked is Outcome<R> {
	return typeof picked === 'object' && picked !== null && 'ok' in picked;
}
