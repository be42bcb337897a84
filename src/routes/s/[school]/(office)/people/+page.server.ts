import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { createApiToken, withdrawApiToken } from '$lib/server/services/people/api-tokens';
import { changeRoles } from '$lib/server/services/people/change-roles';
import { inviteToRole, withdrawRoleInvitation } from '$lib/server/services/people/invite-to-role';
import { readPeople } from '$lib/server/services/people/read-people';
import { setExtraTime } from '$lib/server/services/people/set-extra-time';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = pageLoad(readPeople);

export const actions: Actions = {
	roles: formAction(changeRoles),
	'extra-time': formAction(setExtraTime),
	invite: formAction(inviteToRole),
	'withdraw-invitation': formAction(withdrawRoleInvitation),
	// Its answer is the token itself: nothing of it is kept with a request key.
	'make-token': formAction(createApiToken, {
		keyed: false,
		done: ({ bearer }) => ({ bearer })
	}),
	'withdraw-token': formAction(withdrawApiToken)
};
