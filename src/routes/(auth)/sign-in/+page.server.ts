import { redirect } from '@sveltejs/kit';
import { z } from 'zod';
import { emailAddress } from '$lib/domain/accounts/email';
import { inputProblem } from '$lib/domain/problem';
import { signInWithPassword } from '$lib/server/http/auth/ask-auth';
import { answerForm } from '$lib/server/http/form';
import { afterSignIn } from '$lib/server/http/auth/after-sign-in';
import type { Actions, PageServerLoad } from './$types';

const credentials = z.object({
	email: emailAddress,
	password: z.string().min(1, 'Give your password.').max(200, 'This is too long.')
});

export const load: PageServerLoad = async (event) => {
	const actor = await event.locals.actor();
	if (actor.kind === 'account') redirect(303, afterSignIn(event));
	const outcome = event.url.searchParams.get('error');
	return {
		to: event.url.searchParams.get('to') ?? '',
		set: event.url.searchParams.has('set'),
		refused: outcome !== null
	};
};

export const actions: Actions = {
	default: (event) =>
		answerForm(event, 'sign-in', async ({ values }) => {
			const given = credentials.safeParse(values);
			if (!given.success) throw inputProblem(z.flattenError(given.error).fieldErrors);
			await signInWithPassword(event, given.data.email, given.data.password);
			return afterSignIn(event);
		})
};
