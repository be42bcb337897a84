import { signInAs } from '$lib/server/http/auth/start-session';
import { formAction } from '$lib/server/http/form';
import { standing } from '$lib/server/http/standing';
import { acceptRole, readRoleInvitation } from '$lib/server/services/people/accept-role';
import type { Actions, PageServerLoad } from './$types';

/** An invitation to work in a school. Looking uses nothing up; the button does. */
export const load: PageServerLoad = async ({ locals, params }) => ({
	invited: await standing(readRoleInvitation(await locals.caller(), { token: params.token }))
});

export const actions: Actions = {
	default: formAction(acceptRole, {
		extra: ({ params }) => ({ token: params.token }),
		async done({ accountId, isNew, schoolSlug }, event) {
			if (isNew) await signInAs(event, accountId);
			return `/s/${schoolSlug}`;
		}
	})
};
