import { tryOriginOf } from '$lib/server/http/auth/config';
import { answerForm } from '$lib/server/http/form';
import { askForLink } from '$lib/server/services/accounts/ask-for-link';
import type { Actions } from './$types';

export const actions: Actions = {
	default: (event) =>
		answerForm(event, 'ask-for-link', async ({ values, requestKey }) => {
			const wanted = { email: values.email, purpose: 'password', ...tryOriginOf(event) };
			await askForLink(await event.locals.caller(requestKey), wanted);
			return { asked: String(values.email).trim() };
		})
};
