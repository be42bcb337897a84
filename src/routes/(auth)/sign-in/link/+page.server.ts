import { emailAddress } from '$lib/domain/accounts/email';
import { inputProblem } from '$lib/domain/problem';
import { askForSignInLink } from '$lib/server/http/auth/ask-auth';
import { answerForm } from '$lib/server/http/form';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = ({ url }) => ({
	/** Auth.js's own route ends here after it was asked for a letter. */
	asked: url.searchParams.get('type') === 'email'
});

export const actions: Actions = {
	default: (event) =>
		answerForm(event, 'ask-for-link', async ({ values }) => {
			const email = emailAddress.safeParse(values.email);
			if (!email.success) throw inputProblem({ email: ['Give your e-mail address.'] });
			await askForSignInLink(event, email.data);
			return { asked: email.data };
		})
};
