import type { Quiz } from './schema';

export type EarlierSitting = { handedInAtMs: number | null; passed: boolean };
export type MayBegin =
	{ ok: true; attempt: number; left: number } | { ok: false; because: string; fromAtMs?: number };

const hourMs = 3_600_000;

/**
 * Whether another sitting may begin now. A sitting still open is gone on with, not begun again;
 * a passed quiz is passed.
 * @param extraAttempts what an instructor granted this student on top
 */
export function mayBegin(
	quiz: Pick<Quiz, 'attempts' | 'waitHours'>,
	earlier: readonly EarlierSitting[],
	nowMs: number,
	extraAttempts = 0
): MayBegin {
	if (earlier.some((one) => one.passed)) return no('You have passed this quiz.');
	if (earlier.some((one) => one.handedInAtMs === null))
		return no('A sitting is open. Go on with it.');
	const allowed = quiz.attempts + extraAttempts;
	if (earlier.length >= allowed)
		return no(
			`All ${allowed} attempts are used. Your instructor can grant another when you have gone over the lessons.`
		);
	const last = Math.max(...earlier.map((one) => one.handedInAtMs ?? 0), 0);
	const fromAtMs = earlier.length > 0 ? last + quiz.waitHours * hourMs : 0;
	if (nowMs < fromAtMs)
		return {
			...no(`There are ${quiz.waitHours} hours between attempts, to go over the lessons.`),
			fromAtMs
		};
	return { ok: true, attempt: earlier.length + 1, left: allowed - earlier.length - 1 };
}

function no(because: string): { ok: false; because: string } {
	return { ok: false, because };
}
