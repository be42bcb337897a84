import { fail, redirect, type ActionFailure, type RequestEvent } from '@sveltejs/kit';
import { isUlid } from '$lib/domain/ids';
import { Problem, type FieldProblems } from '$lib/domain/problem';
import type { Caller } from '../services/use-case';
import { isTooLarge } from './handles/body-limit';
import { pageProblem, statusOf, wordsFor } from './problem';
import { holdsSecret, readForm, withoutSecrets } from './read-form';

export type FormFault = {
	/** Which form of the page this is about: the name of its use case. */
	form: string;
	values: Record<string, unknown>;
	fields: FieldProblems;
	words: string;
};
/** What a page reads of a fault is there as well, and empty: a page need not tell the two apart. */
export type FormDone = {
	form: string;
	saved: true;
	values?: undefined;
	fields?: undefined;
	words?: undefined;
};
type Next<Extra> = string | undefined | Extra;
type Answer<Extra> = Promise<ActionFailure<FormFault & Partial<Extra>> | (FormDone & Extra)>;

export type FormOptions<Out, Extra extends object> = {
	/** What the address says (ids), laid over what the form says. */
	extra?: (event: RequestEvent) => Record<string, unknown>;
	/** Where to go next (a path), or data for the page; `sent` is what the form said. */
	done?: (
		answer: Out,
		event: RequestEvent,
		sent: Record<string, unknown>
	) => Next<Extra> | Promise<Next<Extra>>;
	/** Off where the answer is a secret shown once: an answer that is kept could be read again. */
	keyed?: boolean;
};

/**
 * One form, one use case. After an error the values come back, secrets excepted; the request key
 * in the form makes a second press of the button harmless. A form with a password carries no
 * key: what is stored with one would be a quick hash of it.
 */
export function formAction<Out, Extra extends object = object>(
	useCase: (caller: Caller, input: unknown) => Promise<Out>,
	{ extra = () => ({}), done = () => undefined, keyed = true }: FormOptions<Out, Extra> = {}
) {
	return (event: RequestEvent): Answer<Extra> =>
		answerForm<Extra>(event, useCase.name, async ({ values, requestKey }) => {
			const key = keyed && !holdsSecret(values) ? requestKey : undefined;
			const answer = await useCase(await event.locals.caller(key), { ...values, ...extra(event) });
			return done(answer, event, values);
		});
}

export type Sent = { values: Record<string, unknown>; requestKey: string | undefined };

/** The same for what is more than one use case, such as a sign-in through Auth.js. */
export async function answerForm<Extra extends object = object>(
	event: RequestEvent,
	form: string,
	work: (sent: Sent) => Promise<Next<Extra>>
): Answer<Extra> {
	let values: Record<string, unknown> = {};
	let next: Next<Extra>;
	try {
		const sent = await readForm(await formOf(event));
		values = sent.values;
		const requestKey = sent.requestKey && isUlid(sent.requestKey) ? sent.requestKey : undefined;
		next = await work({ values, requestKey });
	} catch (problem) {
		return formFault(event, problem, values, form) as ActionFailure<FormFault & Partial<Extra>>;
	}
	if (typeof next === 'string') redirect(303, next);
	return { form, saved: true, ...next } as FormDone & Extra;
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
