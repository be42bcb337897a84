import { signInAs } from '$lib/server/http/auth/start-session';
import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { foundSchool, readFirstSchoolLink } from '$lib/server/services/accounts/first-school';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = pageLoad(readFirstSchoolLink, ({ params }) => ({
	token: params.token
}));

export const actions: Actions = {
	default: formAction(foundSchool, {
		extra: ({ params }) => ({ token: params.token }),
		async done({ accountId, slug }, event) {
			await signInAs(event, accountId);
			return `/s/${slug}/people`;
		}
	})
};
