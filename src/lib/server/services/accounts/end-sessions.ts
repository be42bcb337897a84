import { z } from 'zod';
import { Problem } from '$lib/domain/problem';
import { sessions } from '../../data/models';
import { endSessions } from '../../data/queries/sessions';
import { tokenHash } from '../../data/queries/tokens';
import { remove } from '../../data/rows';
import { acrossSchools } from '../../data/scope';
import { writeCase } from '../use-case';
import { ownAccount } from './own-account';

/** Signs one device out, from the account page. */
export const endOneSession = writeCase({
	name: 'end-one-session',
	action: 'account:own',
	where: 'common',
	input: z.object({ sessionId: z.string().min(1) }),
	subject: ownAccount,
	async run({ scope, input, subject }) {
		const own = { id: input.sessionId, accountId: subject.accountId };
		const gone = await remove(acrossSchools(scope), sessions, own);
		if (gone === 0) throw new Problem('absent', 'This device is signed out already.');
	}
});

export const endOtherSessions = writeCase({
	name: 'end-other-sessions',
	action: 'account:own',
	where: 'common',
	input: z.object({}),
	subject: ownAccount,
	async run({ scope, subject }) {
		return { ended: await endSessions(scope, subject.accountId, subject.sessionId) };
	}
});

/** Signing out: whoever holds the token may end it. */
export const endSessionWithToken = writeCase({
	name: 'end-session-with-token',
	action: 'session:ask',
	where: 'common',
	input: z.object({ token: z.string().min(1).max(500) }),
	subject: () => Promise.resolve({}),
	async run({ scope, input }) {
		await remove(acrossSchools(scope), sessions, { tokenHash: tokenHash(input.token) });
	}
});
