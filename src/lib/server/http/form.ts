import { fail, redirect, type ActionFailure, type RequestEvent } from '@sveltejs/kit';
import { isUlid } from '$lib/domain/ids';
import { Problem, type FieldProblems } from '$lib/domain/problem';
import type { Caller } from '../services/use-case';
import { pageProblem, statusOf, wordsFor } from './problem';
import { readForm, withoutSecrets } from './read-form';

export type FormFault = {
	values: Record<string, unknown>;
	fields: FieldProblems;
	words: string;
};
type Done<Out> = (answer: Out, event: RequestEvent) => string | Record<string, unknown> | undefined;

/**
 * One form, one use case. After an error the values come back, secrets excepted; the request key
 * in the form makes a second press of the button harmless.
 * @param extra what the address says (ids), laid over what the form says
 * @param done where to go next (a path), or data for the page
 */
export function formAction<Out>(
	useCase: (caller: Caller, input: unknown) => Promise<Out>,
	{
		extra = () => ({}),
		done = () => undefined
	}: { extra?: (event: RequestEvent) => Record<string, unknown>; done?: Done<Out> } = {}
) {
	return async (
		event: RequestEvent
	): Promise<ActionFailure<FormFault> | ({ saved: true } & Record<string, unknown>)> => {
		const { values, requestKey } = readForm(await event.request.formData());
		const key = requestKey && isUlid(requestKey) ? requestKey : undefined;
		let answer: Out;
		try {
			answer = await useCase(await event.locals.caller(key), { ...values, ...extra(event) });
		} catch (problem) {
			return formFault(event, problem, values);
		}
		const next = done(answer, event);
		if (typeof next === 'string') redirect(303, next);
		return { saved: true as const, ...next };
	};
}

/** @throws what is no expected problem, and what only another page can answer */
export function formFault(
	event: RequestEvent,
	problem: unknown,
	values: Record<string, unknown>
): ActionFailure<FormFault> {
	if (!(problem instanceof Problem)) throw problem;
	if (problem.code === 'signed-out' && !event.route.id?.includes('(auth)'))
		pageProblem(event, problem);
	return fail(statusOf[problem.code], {
		values: withoutSecrets(values),
		fields: problem.fields,
		words: wordsFor(event, problem)
	});
}
