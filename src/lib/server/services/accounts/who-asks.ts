import { z } from 'zod';
import { anyone, type Actor } from '$lib/domain/actor';
import { Problem } from '$lib/domain/problem';
import { actorOfBearer, noteApiTokenUse } from '../../data/queries/api-tokens';
import { actorOfSession, touchSession } from '../../data/queries/sessions';
import { readCase, writeCase } from '../use-case';

const secret = z.string().min(20).max(200);

/** Who holds this session cookie; `anyone` where it is none, or has ended. */
export const whoHoldsSession = readCase({
	name: 'who-holds-session',
	action: 'site:read',
	where: 'common',
	input: z.object({ token: z.string().max(500) }),
	subject: () => Promise.resolve({}),
	run: async ({ scope, input, at }): Promise<{ actor: Actor; seenAt: string | null }> =>
		(await actorOfSession(scope, input.token, at)) ?? { actor: anyone, seenAt: null }
});

/** Which school's script holds this bearer token. */
export const whoHoldsApiToken = readCase({
	name: 'who-holds-api-token',
	action: 'site:read',
	where: 'common',
	input: z.object({ token: secret }),
	subject: () => Promise.resolve({}),
	async run({ scope, input }) {
		const found = await actorOfBearer(scope, input.token);
		if (!found) throw new Problem('signed-out', 'This token is not known, or was withdrawn.');
		return found;
	}
});

/** Notes that a token is in use: the office sees which ones are forgotten. */
export const noteApiTokenUsed = writeCase({
	name: 'note-api-token-used',
	action: 'session:open',
	where: 'common',
	input: z.object({ tokenId: z.string() }),
	subject: () => Promise.resolve({}),
	async run({ scope, input, at }) {
		await noteApiTokenUse(scope, input.tokenId, at.toISOString());
	}
});

/** Notes that a session is in use, so that its owner can tell it from a forgotten one. */
export const noteSessionSeen = writeCase({
	name: 'note-session-seen',
	action: 'account:own',
	where: 'common',
	input: z.object({}),
	subject: ({ actor }) =>
		Promise.resolve(actor.kind === 'account' ? { accountId: actor.accountId, actor } : undefined),
	async run({ scope, subject, at }) {
		await touchSession(scope, subject.actor.sessionId, at);
	}
});
