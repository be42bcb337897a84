import { describe, expect, it } from 'vitest';
import { countsStill, deadlineOf, graceSeconds, leftMs } from '$lib/domain/quizzes/deadline';
import { mayBegin } from '$lib/domain/quizzes/may-begin';

const noonMs = Date.UTC(2026, 2, 2, 12);
const minuteMs = 60_000;
const hourMs = 60 * minuteMs;

describe('the deadline', () => {
	it('is a stored instant, later by the extra time granted', () => {
		expect(deadlineOf(noonMs, 20)).toBe(noonMs + 20 * minuteMs);
		expect(deadlineOf(noonMs, 20, 0.25)).toBe(noonMs + 25 * minuteMs);
		expect(deadlineOf(noonMs, null, 0.25)).toBeNull();
		expect(() => deadlineOf(noonMs, 20, -0.1)).toThrow(RangeError);
	});

	it('counts what arrives within the grace, and nothing after', () => {
		const deadline = deadlineOf(noonMs, 20) ?? 0;
		expect(countsStill(deadline + graceSeconds * 1000, deadline)).toBe(true);
		expect(countsStill(deadline + graceSeconds * 1000 + 1, deadline)).toBe(false);
		expect(countsStill(Number.MAX_SAFE_INTEGER, null)).toBe(true);
		expect(leftMs(deadline + 1, deadline)).toBe(0);
	});
});

describe('another sitting', () => {
	const quiz = { attempts: 2, waitHours: 24 };
	const failed = { handedInAtMs: noonMs, passed: false };

	it('may begin the first time, and after the wait', () => {
		expect(mayBegin(quiz, [], noonMs)).toEqual({ ok: true, attempt: 1, left: 1 });
		expect(mayBegin(quiz, [failed], noonMs + 24 * hourMs)).toEqual({
			ok: true,
			attempt: 2,
			left: 0
		});
	});

	it('waits, and says until when', () => {
		expect(mayBegin(quiz, [failed], noonMs + 24 * hourMs - 1)).toMatchObject({
			ok: false,
			fromAtMs: noonMs + 24 * hourMs
		});
	});

	it('may not begin after a pass, beside an open one, or past the attempts unless one is granted', () => {
		const later = noonMs + 48 * hourMs;
		expect(mayBegin(quiz, [{ ...failed, passed: true }], later).ok).toBe(false);
		expect(mayBegin(quiz, [{ handedInAtMs: null, passed: false }], later).ok).toBe(false);
		expect(mayBegin(quiz, [failed, failed], later).ok).toBe(false);
		expect(mayBegin(quiz, [failed, failed], later, 1)).toMatchObject({ ok: true, attempt: 3 });
	});
});
