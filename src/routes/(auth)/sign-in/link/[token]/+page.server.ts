import { signInWithLink } from '$lib/server/http/auth/ask-auth';
import { afterSignIn } from '$lib/server/http/auth/after-sign-in';
import { answerForm } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { readSignInLink } from '$lib/server/services/accounts/use-sign-in-link';
import type { Actions, PageServerLoad } from './$types';

/** Opening the page uses nothing up: mail scanners open links. The button does. */
export const load: PageServerLoad = pageLoad(readSignInLink, ({ params }) => ({
	token: params.token
}));

export const actions: Actions = {
	default: (event) =>
		answerForm(event, 'use-sign-in-link', async () => {
			await signInWithLink(event, event.params.token);
			return afterSignIn(event);
		})
};
