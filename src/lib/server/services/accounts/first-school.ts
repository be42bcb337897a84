import { z } from 'zod';
import { emailAddress } from '$lib/domain/accounts/email';
import { newSchool } from '$lib/domain/accounts/new-school';
import { newPassword } from '$lib/domain/accounts/password';
import { system } from '$lib/domain/actor';
import { Problem } from '$lib/domain/problem';
import { accounts, people, personRoles, schools } from '../../data/models';
import { accountByEmail } from '../../data/queries/accounts';
import { allSchools } from '../../data/queries/schools';
import { makeToken, readToken, useToken } from '../../data/queries/tokens';
import { insert } from '../../data/rows';
import { acrossSchools, within } from '../../data/scope';
import { hashPassword } from '../../gateways/passwords/passwords';
import type { House } from '../house';
import { readCase, writeCase } from '../use-case';

const heldForMs = 7 * 24 * 3600 * 1000;
const token = z.string().max(200);
const spent = 'This link was used already or is too old. Start the server again for a new one.';

/** For the start of an empty installation: a link to print once, or nothing where schools exist. */
const makeFirstSchoolLink = writeCase({
	name: 'make-first-school-link',
	action: 'system:run',
	where: 'common',
	input: z.object({}),
	subject: () => Promise.resolve({}),
	async run({ scope, house, at }) {
		if ((await allSchools(scope)).length > 0) return null;
		const made = await makeToken(scope, house.chance(32), {
			purpose: 'first-school',
			identifier: 'first-school',
			at,
			heldForMs
		});
		return `${house.config.ORIGIN}/first-school/${made}`;
	}
});

export function firstSchoolLink(house: House): Promise<string | null> {
	return makeFirstSchoolLink({ house, actor: system, schoolId: undefined }, {});
}

export const readFirstSchoolLink = readCase({
	name: 'read-first-school-link',
	action: 'school:found',
	where: 'common',
	input: z.object({ token }),
	subject: () => Promise.resolve({}),
	run: async ({ scope, input, at }) => ({
		stands: (await readToken(scope, 'first-school', input.token, at)) !== undefined
	})
});

/** Makes the first school and its admin, once. */
export const foundSchool = writeCase({
	name: 'found-school',
	action: 'school:found',
	where: 'common',
	input: newSchool.extend({
		token,
		name: z.string().trim().min(1, 'Give your name.').max(120),
		email: emailAddress,
		password: newPassword
	}),
	prepare: ({ input }) => hashPassword(input.password),
	subject: () => Promise.resolve({}),
	async run({ scope, input, prepared: passwordHash, at, newId, record }) {
		const held = await useToken(scope, 'first-school', input.token, at);
		if (held === undefined || (await allSchools(scope)).length > 0)
			throw new Problem('closed', spent);
		if (await accountByEmail(scope, input.email))
			throw new Problem('conflict', 'There is an account with this address.');
		const { slug, town, locale, timeZone, currency, email, name } = input;
		const createdAt = at.toISOString();
		const [schoolId, accountId, personId] = [newId(), newId(), newId()];
		const common = acrossSchools(scope);
		const school = { id: schoolId, slug, town, locale, timeZone, currency, createdAt };
		await insert(common, schools, { ...school, name: input.schoolName });
		const account = { id: accountId, email, name, passwordHash, createdAt };
		await insert(common, accounts, { ...account, emailVerifiedAt: null });
		const here = within(scope, schoolId);
		const person = { id: personId, accountId, name, createdAt };
		await insert(here, people, { ...person, studentNumber: null, extraTimePercent: 0 });
		await insert(here, personRoles, { personId, role: 'admin', givenAt: createdAt });
		const data = { admin: personId, slug, timeZone, currency };
		await record({ schoolId, kind: 'school-founded', subject: schoolId, data });
		return { accountId, slug };
	}
});
