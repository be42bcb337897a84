import { signInAs } from '$lib/server/http/auth/start-session';
import { formAction } from '$lib/server/http/form';
import { load as ask } from '$lib/server/http/page';
import { acceptRole, readRoleInvitation } from '$lib/server/services/people/accept-role';
import { Problem } from '$lib/domain/problem';
import type { Actions, PageServerLoad } from './$types';

/** An invitation to work in a school. Looking uses nothing up; the button does. */
export const load: PageServerLoad = async (event) => {
	const caller = await event.locals.caller();
	const { token } = event.params;
	// Used up, withdrawn and invented look the same, and are no error: the page says what to do.
	const gone = await readRoleInvitation(caller, { token }).then(
		() => false,
		(problem: unknown) => problem instanceof Problem
	);
	return { invited: gone ? null : await ask(event, readRoleInvitation, { token }) };
};

export const actions: Actions = {
	default: formAction(acceptRole, {
		extra: ({ params }) => ({ token: params.token }),
		async done({ accountId, isNew, schoolSlug }, event) {
			if (isNew) await signInAs(event, accountId);
			return `/s/${schoolSlug}`;
		}
	})
};
