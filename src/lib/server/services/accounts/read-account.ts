import { z } from 'zod';
import { accountById } from '../../data/queries/accounts';
import { sessionsOf } from '../../data/queries/sessions';
import { readCase } from '../use-case';
import { ownAccount } from './own-account';

/** The account page: who one is, and where one is signed in. No token, hash or whole address. */
export const readAccount = readCase({
	name: 'read-account',
	action: 'account:own',
	where: 'common',
	input: z.object({}).default({}),
	subject: ownAccount,
	async run({ scope, subject, at, actor }) {
		const [account, open] = await Promise.all([
			accountById(scope, subject.accountId),
			sessionsOf(scope, subject.accountId, at)
		]);
		return {
			email: subject.email,
			name: subject.name,
			hasPassword: account?.passwordHash != null,
			sessions: open.map((one) => ({
				id: one.id,
				device: one.device,
				address: one.address,
				createdAt: one.createdAt,
				seenAt: one.seenAt,
				isThis: one.id === subject.sessionId
			})),
			memberships: actor.kind === 'account' ? actor.memberships : []
		};
	}
});
