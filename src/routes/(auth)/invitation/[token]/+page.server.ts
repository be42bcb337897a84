import { signInAs } from '$lib/server/http/auth/start-session';
import { formAction } from '$lib/server/http/form';
import { standing } from '$lib/server/http/standing';
import { acceptInvitation } from '$lib/server/services/cohorts/accept-invitation';
import { readInvitation } from '$lib/server/services/cohorts/read-invitation';
import type { Actions, PageServerLoad } from './$types';

/** A student's place in a cohort. Looking uses nothing up; the button does. */
export const load: PageServerLoad = async ({ locals, params }) => ({
	invited: await standing(readInvitation(await locals.caller(), { token: params.token }))
});

export const actions: Actions = {
	default: formAction(acceptInvitation, {
		extra: ({ params }) => ({ token: params.token }),
		async done({ accountId, isNew, schoolSlug }, event) {
			if (isNew) await signInAs(event, accountId);
			return `/s/${schoolSlug}/bench`;
		}
	})
};
