import { z } from 'zod';
import { Problem } from '$lib/domain/problem';
import { scriptScopes } from '$lib/domain/access/script-scopes';
import { makeApiToken, revokeApiToken } from '../../data/queries/api-tokens';
import { writeCase } from '../use-case';

/**
 * Makes a token for one of the school's own scripts. The answer is the only place where it
 * stands: the database keeps its hash.
 */
export const createApiToken = writeCase({
	name: 'create-api-token',
	action: 'api-token:manage',
	input: z.object({
		name: z.string().trim().min(1, 'Say what the token is for.').max(80),
		scopes: z.array(z.enum(scriptScopes)).min(1, 'Choose at least one thing it may do.')
	}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, house, input, me, at, newId, record }) {
		const id = newId();
		const bearer = `rl_${Buffer.from(house.chance(32)).toString('base64url')}`;
		const { name, scopes } = input;
		const createdAt = at.toISOString();
		await makeApiToken(scope, { id, name, scopes, createdBy: me, createdAt, token: bearer });
		await record({ kind: 'api-token-made', subject: id, data: { scopes } });
		return { id, bearer };
	}
});

export const withdrawApiToken = writeCase({
	name: 'withdraw-api-token',
	action: 'api-token:manage',
	input: z.object({ id: z.string().min(1) }),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, input, at, record }) {
		if ((await revokeApiToken(scope, input.id, at.toISOString())) === 0)
			throw new Problem('absent', 'There is no such token, or it was withdrawn already.');
		await record({ kind: 'api-token-withdrawn', subject: input.id, data: {} });
	}
});
