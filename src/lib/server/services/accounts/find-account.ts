import { z } from 'zod';
import { accountByEmail, accountById } from '../../data/queries/accounts';
import { readCase } from '../use-case';

/** What Auth.js wants to know of somebody; only the server itself asks. */
export const findAccount = readCase({
	name: 'find-account',
	action: 'session:open',
	where: 'common',
	input: z.union([z.object({ email: z.string() }), z.object({ id: z.string() })]),
	subject: () => Promise.resolve({}),
	async run({ scope, input }) {
		const found = await ('email' in input
			? accountByEmail(scope, input.email)
			: accountById(scope, input.id));
		if (!found) return null;
		const { id, email, name, emailVerifiedAt } = found;
		return { id, email, name, emailVerifiedAt };
	}
});
