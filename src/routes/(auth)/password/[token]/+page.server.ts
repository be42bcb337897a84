import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { readPasswordLink, resetPassword } from '$lib/server/services/accounts/set-password';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = pageLoad(readPasswordLink, ({ params }) => ({
	token: params.token
}));

export const actions: Actions = {
	default: formAction(resetPassword, {
		extra: ({ params }) => ({ token: params.token }),
		done: () => '/sign-in?set'
	})
};
