import { z } from 'zod';
import { peopleOfSchool, waitingRoleInvitations } from '../../data/queries/people';
import { apiTokensOf } from '../../data/queries/api-tokens';
import { readCase } from '../use-case';

/** The office's page of people: who is here as what, who is invited, which scripts have a token. */
export const readPeople = readCase({
	name: 'read-people',
	action: 'people:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, me }) {
		const [people, invited, tokens] = await Promise.all([
			peopleOfSchool(scope),
			waitingRoleInvitations(scope),
			apiTokensOf(scope)
		]);
		return {
			people: people.map(({ id, name, email, studentNumber, extraTimePercent, roles }) => ({
				id,
				name,
				email,
				studentNumber,
				extraTimePercent,
				roles,
				isMe: id === me
			})),
			invited: invited.map(({ id, name, email, roles, invitedAt }) => ({
				id,
				name,
				email,
				roles,
				invitedAt
			})),
			tokens: tokens.map(({ id, name, scopes, createdAt, lastUsedAt, revokedAt }) => ({
				id,
				name,
				scopes,
				createdAt,
				lastUsedAt,
				revokedAt
			}))
		};
	}
});
