import { randomUUID } from 'node:crypto';
import { error, json, redirect, type RequestEvent } from '@sveltejs/kit';
import type { Problem } from '$lib/domain/problem';
import { wordsOf, type ProblemCode } from '$lib/domain/problem';

/** The one table from a problem's code to HTTP's status. */
export const statusOf: Record<ProblemCode, number> = {
	input: 400,
	'signed-out': 401,
	absent: 404,
	conflict: 409,
	stale: 409,
	closed: 410,
	'too-many': 429,
	'too-large': 413,
	refused: 402,
	unavailable: 503
};

/** In the school's own locale and time zone where the address names a school. */
export function wordsFor(event: RequestEvent, problem: Problem): string {
	const { locale = 'en-GB', timeZone = 'UTC' } = event.locals.school ?? {};
	const time = new Intl.DateTimeFormat(locale, {
		timeStyle: 'short',
		dateStyle: 'medium',
		timeZone
	});
	return wordsOf(problem, (value) => {
		if (value instanceof Date) return time.format(value);
		return typeof value === 'number' ? new Intl.NumberFormat(locale).format(value) : value;
	});
}

/** Problem details, RFC 9457. */
export function problemResponse(event: RequestEvent, problem: Problem): Response {
	const status = statusOf[problem.code];
	return json(
		{
			type: `${event.locals.house.config.ORIGIN}/problems/${problem.code}`,
			title: problem.code,
			status,
			detail: wordsFor(event, problem),
			...(Object.keys(problem.fields).length > 0 ? { fields: problem.fields } : {}),
			...(problem.detail === undefined ? {} : { conflict: problem.detail })
		},
		{
			status,
			headers: {
				'content-type': 'application/problem+json',
				...waitHeader(problem, event.locals.house.now().getTime())
			}
		}
	);
}

/** What nobody expected, in the same form; the log has it under the id. */
export function unexpectedResponse(event: RequestEvent, fault: unknown): Response {
	const id = randomUUID();
	const { house, requestId } = event.locals;
	house.log.error({ err: fault, id, requestId, route: event.route.id }, 'unexpected');
	return json(
		{
			type: `${house.config.ORIGIN}/problems/unexpected`,
			title: 'unexpected',
			status: 500,
			detail: `Something went wrong here. It was noted under ${id}.`,
			id
		},
		{ status: 500, headers: { 'content-type': 'application/problem+json' } }
	);
}

/** For a page: to the sign-in with the way back, or the error page in words. */
export function pageProblem(event: RequestEvent, problem: Problem): never {
	if (problem.code === 'signed-out') {
		const back = event.url.pathname + event.url.search;
		redirect(303, `/sign-in?to=${encodeURIComponent(back)}`);
	}
	error(statusOf[problem.code], { message: wordsFor(event, problem) });
}

function waitHeader(problem: Problem, nowMs: number): Record<string, string> {
	const until = problem.parameters.until;
	if (problem.code !== 'too-many' || !(until instanceof Date)) return {};
	const seconds = Math.max(1, Math.ceil((until.getTime() - nowMs) / 1000));
	return { 'retry-after': String(seconds) };
}
