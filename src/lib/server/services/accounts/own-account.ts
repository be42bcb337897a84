import type { Actor } from '$lib/domain/actor';

/** The subject of what people do with their own account. */
export function ownAccount({ actor }: { actor: Actor }) {
	if (actor.kind !== 'account') return Promise.resolve(undefined);
	const { accountId, sessionId, email, name } = actor;
	return Promise.resolve({ accountId, sessionId, email, name });
}
