import type { RequestEvent } from '@sveltejs/kit';
import { Problem } from '$lib/domain/problem';
import type { Caller } from '../services/use-case';
import { pageProblem } from './problem';

/** A page's load: one use case, its problems worded as a page. */
export function pageLoad<Out, Event extends RequestEvent = RequestEvent>(
	useCase: (caller: Caller, input: unknown) => Promise<Out>,
	inputOf: (event: Event) => unknown = () => ({})
) {
	return async (event: Event): Promise<Out> => load(event, useCase, inputOf(event));
}

/** The same for a page that needs more than one. */
export async function load<Out>(
	event: RequestEvent,
	useCase: (caller: Caller, input: unknown) => Promise<Out>,
	input: unknown = {}
): Promise<Out> {
	try {
		return await useCase(await event.locals.caller(), input);
	} catch (problem) {
		if (problem instanceof Problem) pageProblem(event, problem);
		throw problem;
	}
}
