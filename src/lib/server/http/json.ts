import { isHttpError, isRedirect, json, type RequestEvent } from '@sveltejs/kit';
import { isUlid } from '$lib/domain/ids';
import { inputProblem, Problem } from '$lib/domain/problem';
import type { Caller } from '../services/use-case';
import { isTooLarge } from './handles/body-limit';
import { problemResponse, unexpectedResponse } from './problem';

type UseCase<Out> = (caller: Caller, input: unknown) => Promise<Out>;

/** A JSON write: application/json only, from the own origin where a cookie says who asks. */
export function jsonWrite<Out, Event extends RequestEvent>(
	useCase: UseCase<Out>,
	extra: (event: Event) => Record<string, unknown> = () => ({})
) {
	return async (event: Event): Promise<Response> =>
		answered(event, async () => {
			demandJson(event);
			await demandOrigin(event);
			const { requestKey, ...body } = await readBody(event);
			if (typeof requestKey !== 'string' || !isUlid(requestKey))
				throw inputProblem({ requestKey: ['Send a ULID of your own with each write.'] });
			return json(
				(await useCase(await event.locals.caller(requestKey), { ...body, ...extra(event) })) ?? {}
			);
		});
}

/** A JSON read. */
export function jsonRead<Out, Event extends RequestEvent>(
	useCase: UseCase<Out>,
	inputOf: (event: Event) => unknown = () => ({})
) {
	return async (event: Event): Promise<Response> =>
		answered(event, async () =>
			json(await useCase(await event.locals.caller(), inputOf(event)), {
				headers: { 'cache-control': 'private, no-store' }
			})
		);
}

/** Runs what may fail in an expected way, and answers that with problem details. */
export async function answered(
	event: RequestEvent,
	work: () => Promise<Response>
): Promise<Response> {
	try {
		return await work();
	} catch (problem) {
		if (problem instanceof Problem) return problemResponse(event, problem);
		if (isHttpError(problem) || isRedirect(problem)) throw problem;
		return unexpectedResponse(event, problem);
	}
}

function demandJson(event: RequestEvent): void {
	const type = event.request.headers.get('content-type') ?? '';
	if (!/^application\/json\s*(;|$)/i.test(type))
		throw inputProblem({ 'content-type': ['Send application/json.'] });
}

/** A cookie is sent by the browser on anybody's behalf; a bearer token only by who holds it. */
export async function demandOrigin(event: RequestEvent): Promise<void> {
	const actor = await event.locals.actor();
	if (actor.kind === 'script') return;
	if (event.request.headers.get('origin') !== event.locals.house.config.ORIGIN)
		throw new Problem('input', 'This request comes from another site. Use the page itself.');
}

async function readBody(event: RequestEvent): Promise<Record<string, unknown>> {
	const text = await event.request.text().catch((error: unknown) => {
		if (isTooLarge(error)) throw new Problem('too-large', 'Send at most 512 kB at once.');
		throw error;
	});
	try {
		const body: unknown = JSON.parse(text);
		if (body && typeof body === 'object' && !Array.isArray(body))
			return body as Record<string, unknown>;
	} catch {
		throw inputProblem({ body: ['This is no JSON.'] });
	}
	throw inputProblem({ body: ['Send one JSON object.'] });
}
