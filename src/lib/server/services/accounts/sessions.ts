import { z } from 'zod';
import { deviceWords } from '$lib/domain/accounts/device-words';
import type { Actor } from '$lib/domain/actor';
import {
	accountById,
	endOtherSessions,
	endSession,
	knowDevice,
	makeSession,
	sessionsOf
} from '../../data/queries/accounts';
import { readCase, writeCase } from '../use-case';

export const sessionHeldForDays = 30;

/**
 * A new session under a new token, made after somebody has proven who they are. Only the hash
 * of the token is kept. For the edge alone: it acts as the system.
 */
export const beginSession = writeCase({
	name: 'begin-session',
	action: 'system:run',
	where: 'common',
	input: z.object({
		accountId: z.string(),
		token: z.string().min(32),
		device: z.string().nullable(),
		userAgent: z.string().nullable(),
		address: z.string()
	}),
	async subject({ scope, input }) {
		return (await accountById(scope, input.accountId)) ? {} : undefined;
	},
	async run({ scope, input, at, newId }) {
		const expiresAt = new Date(at.getTime() + sessionHeldForDays * 24 * 3600 * 1000);
		await makeSession(scope, {
			id: newId(),
			accountId: input.accountId,
			token: input.token,
			device: deviceWords(input.userAgent),
			address: input.address,
			at,
			expiresAt
		});
		if (input.device) await knowDevice(scope, input.accountId, input.device, at);
		return { expiresAt: expiresAt.toISOString() };
	}
});

const ownAccount = ({ actor }: { actor: Actor }) =>
	Promise.resolve(actor.kind === 'account' ? { accountId: actor.accountId, actor } : undefined);

export const readAccount = readCase({
	name: 'read-account',
	action: 'account:own',
	where: 'common',
	input: z.object({}).default({}),
	subject: ownAccount,
	async run({ scope, subject: { actor } }) {
		const rows = await sessionsOf(scope, actor.accountId);
		return {
			name: actor.name,
			email: actor.email,
			memberships: actor.memberships,
			sessions: rows.map(({ id, device, address, createdAt, seenAt }) => ({
				id,
				device,
				address,
				createdAt,
				seenAt,
				current: id === actor.sessionId
			}))
		};
	}
});

export const revokeSession = writeCase({
	name: 'revoke-session',
	action: 'account:own',
	where: 'common',
	input: z.object({ sessionId: z.string() }),
	subject: ownAccount,
	async run({ scope, subject: { actor }, input }) {
		const ended = await endSession(scope, { id: input.sessionId, accountId: actor.accountId });
		return { ended };
	}
});

export const revokeOtherSessions = writeCase({
	name: 'revoke-other-sessions',
	action: 'account:own',
	where: 'common',
	input: z.object({}).default({}),
	subject: ownAccount,
	run: async ({ scope, subject: { actor } }) => ({
		ended: await endOtherSessions(scope, actor.accountId, actor.sessionId)
	})
});
