import { fail, redirect, type ActionFailure, type RequestEvent } from '@sveltejs/kit';
import { isUlid } from '$lib/domain/ids';
import { Problem, type FieldProblems } from '$lib/domain/problem';
import type { Caller } from '../services/use-case';
import { BodyTooLarge } from './handles/body-limit';
import { pageProblem, statusOf, wordsFor } from './problem';
import { holdsSecret, readForm, withoutSecrets } from './read-form';

export type FormFault = {
	/** Which form of the page this is about: the name of its use case. */
	form: string;
	values: Record<string, unknown>;
	fields: FieldProblems;
	words: string;
};
export type FormDone = { form: string; saved: true } & Record<string, unknown>;
type Next = string | Record<string, unknown> | undefined;

export type FormOptions<Out> = {
	/** What the address says (ids), laid over what the form says. */
	extra?: (event: RequestEvent) => Record<string, unknown>;
	/** Where to go next (a path), or data for the page. */
	done?: (answer: Out, event: RequestEvent) => Next | Promise<Next>;
	/** Off where the answer is a secret shown once: an answer that is kept could be read again. */
	keyed?: boolean;
};

/**
 * One form, one use case. After an error the values come back, secrets excepted; the request key
 * in the form makes a second press of the button harmless. A form with a password carries no
 * key: what is stored with one would be a quick hash of it.
 */
export function formAction<Out>(
	useCase: (caller: Caller, input: unknown) => Promise<Out>,
	{ extra = () => ({}), done = () => undefined, keyed = true }: FormOptions<Out> = {}
) {
	return (event: RequestEvent): Promise<ActionFailure<FormFault> | FormDone> =>
		answerForm(event, useCase.name, async ({ values, requestKey }) => {
			const key = keyed && !holdsSecret(values) ? requestKey : undefined;
			const answer = await useCase(await event.locals.caller(key), { ...values, ...extra(event) });
			return done(answer, event);
		});
}

export type Sent = { values: Record<string, unknown>; requestKey: string | undefined };

/** The same for what is more than one use case, such as a sign-in through Auth.js. */
export async function answerForm(
	event: RequestEvent,
	form: string,
	work: (sent: Sent) => Promise<Next>
): Promise<ActionFailure<FormFault> | FormDone> {
	let values: Record<string, unknown> = {};
	let next: Next;
	try {
		const sent = await readForm(await formOf(event));
		values = sent.values;
		const requestKey = sent.requestKey && isUlid(sent.requestKey) ? sent.requestKey : undefined;
		next = await work({ values, requestKey });
	} catch (problem) {
		return formFault(event, problem, values, form);
	}
	if (typeof next === 'string') redirect(303, next);
	return { form, saved: true, ...next };
}

/** @throws what is no expected problem, and what only another page can answer */
export function formFault(
	event: RequestEvent,
	problem: unknown,
	values: Record<string, unknown>,
	form = ''
): ActionFailure<FormFault> {
	if (!(problem instanceof Problem)) throw problem;
	if (problem.code === 'signed-out' && !event.route.id?.includes('(auth)'))
		pageProblem(event, problem);
	return fail(statusOf[problem.code], {
		form,
		values: withoutSecrets(values),
		fields: problem.fields,
		words: wordsFor(event, problem)
	});
}

async function formOf(event: RequestEvent): Promise<FormData> {
	try {
		return await event.request.formData();
	} catch (error) {
		if (isTooLarge(error))
			throw new Problem('too-large', 'This is more than 512 kB. Send it in smaller parts.');
		throw new Problem('input', 'The form arrived incomplete. Send it again.');
	}
}

/** The reader of a body wraps what stopped the body. */
export function isTooLarge(error: unknown): boolean {
	return (
		error instanceof BodyTooLarge || (error instanceof Error && error.cause instanceof BodyTooLarge)
	);
}
