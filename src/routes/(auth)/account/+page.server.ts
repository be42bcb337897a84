import { tryOriginOf } from '$lib/server/http/auth/config';
import { answerForm, formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { endOneSession, endOtherSessions } from '$lib/server/services/accounts/end-sessions';
import { readAccount } from '$lib/server/services/accounts/read-account';
import { changePassword } from '$lib/server/services/accounts/set-password';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = pageLoad(readAccount);

export const actions: Actions = {
	end: formAction(endOneSession),
	'end-others': formAction(endOtherSessions),
	password: (event) =>
		answerForm(event, 'change-password', async ({ values }) =>
			changePassword(await event.locals.caller(), values, tryOriginOf(event))
		)
};
