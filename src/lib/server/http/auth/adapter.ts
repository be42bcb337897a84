import type { Adapter, AdapterUser } from '@auth/core/adapters';
import type { RequestEvent } from '@sveltejs/kit';
import { anyone, system } from '$lib/domain/actor';
import { endSessionWithToken } from '../../services/accounts/end-sessions';
import { findAccount } from '../../services/accounts/find-account';
import { useSignInLink } from '../../services/accounts/use-sign-in-link';
import { whoHoldsSession } from '../../services/accounts/who-asks';
import { startSession } from './start-session';

/**
 * Auth.js on our own services. The stock adapter writes outside the write queue, keeps tokens
 * as they are, and lets a link be used twice when two come at once.
 */
export function adapterFor(event: RequestEvent): Adapter {
	const { house } = event.locals;
	const asSystem = { house, actor: system, schoolId: undefined };
	const asAnyone = { house, actor: anyone, schoolId: undefined };
	const user = async (wanted: { email: string } | { id: string }) => {
		const found = await findAccount(asSystem, wanted);
		return found ? asUser(found) : null;
	};
	return {
		getUser: (id) => user({ id }),
		getUserByEmail: (email) => user({ email }),
		getUserByAccount: () => Promise.resolve(null),
		createUser: () => Promise.reject(new Error('nobody makes an account by signing in')),
		// That the mailbox is proven was written when the link was used up.
		async updateUser({ id }) {
			const found = await user({ id });
			if (!found) throw new Error('there is no such account');
			return found;
		},
		async createSession({ sessionToken, userId }) {
			const { expires } = await startSession(event, userId, sessionToken);
			return { sessionToken, userId, expires };
		},
		async getSessionAndUser(sessionToken) {
			const { actor } = await whoHoldsSession(asAnyone, { token: sessionToken });
			if (actor.kind !== 'account') return null;
			const found = await user({ id: actor.accountId });
			if (!found) return null;
			const expires = new Date(house.now().getTime() + 24 * 3600 * 1000);
			return { user: found, session: { sessionToken, userId: found.id, expires } };
		},
		updateSession: () => Promise.resolve(null),
		deleteSession: (token) => endSessionWithToken(asAnyone, { token }),
		// The job that writes the letter makes the token, in one transaction with the letter.
		createVerificationToken: (token) => Promise.resolve(token),
		async useVerificationToken({ token }) {
			const used = await useSignInLink(asSystem, { tokenHash: token });
			return used && { identifier: used.email, token, expires: inAMinute(house.now()) };
		}
	};
}

type Found = { id: string; email: string; name: string; emailVerifiedAt: string | null };

function asUser({ id, email, name, emailVerifiedAt }: Found): AdapterUser {
	return { id, email, name, emailVerified: emailVerifiedAt ? new Date(emailVerifiedAt) : null };
}

/** The expiry was decided where the token was used up; Auth.js wants one to look at as well. */
function inAMinute(now: Date): Date {
	return new Date(Math.max(now.getTime(), Date.now()) + 60_000);
}
