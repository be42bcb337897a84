/**
 * What a sum gives back when the trade can say "that cannot be computed, because".
 * Misuse by the programmer throws; a reading that makes no sense does not.
 */
export type Outcome<T> = { ok: true; value: T } | { ok: false; because: string };

export function computed<T>(value: T): Outcome<T> {
	return { ok: true, value };
}

/** @param because a plain sentence for the person who typed the values. */
export function cannot(because: string): { ok: false; because: string } {
	return { ok: false, because };
}
