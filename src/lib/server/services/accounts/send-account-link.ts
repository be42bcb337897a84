import { z } from 'zod';
import { lifetimes } from '$lib/domain/accounts/lifetimes';
import { accountByEmail } from '../../data/queries/accounts';
import { makeToken } from '../../data/queries/tokens';
import { writeCase } from '../use-case';

const heldFor = {
	'sign-in': lifetimes.signInLinkMinutes,
	password: lifetimes.passwordLinkMinutes
} as const;
const pages = { 'sign-in': 'sign-in/link', password: 'password' } as const;
const letters = { 'sign-in': 'sign-in-link', password: 'password-reset' } as const;

/** The job behind `ask-for-link`: a letter where there is an account, nothing where there is none. */
export const sendAccountLink = writeCase({
	name: 'send-account-link',
	action: 'system:run',
	where: 'common',
	input: z.object({ email: z.string(), purpose: z.enum(['sign-in', 'password']) }),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input: { email, purpose }, at, mail }) {
		const account = await accountByEmail(scope, email);
		if (!account) return;
		const heldForMinutes = heldFor[purpose];
		const token = await makeToken(scope, house.chance(32), {
			purpose,
			identifier: email,
			at,
			heldForMs: heldForMinutes * 60_000
		});
		await mail({
			kind: letters[purpose],
			to: email,
			payload: { heldForMinutes },
			links: { link: `${house.config.ORIGIN}/${pages[purpose]}/${token}` }
		});
	}
});
