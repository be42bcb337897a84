import { z } from 'zod';
import { emailAddress } from '$lib/domain/accounts/email';
import { writeCase } from '../use-case';
import { bucketsOf, countTry, tryOrigin } from './wait-buckets';

/**
 * Asks for a letter with a link. Whether there is an account is found out later, by the job:
 * this answers the same, after the same work, for an address that nobody has.
 */
export const askForLink = writeCase({
	name: 'ask-for-link',
	action: 'session:ask',
	where: 'common',
	input: z.object({ email: emailAddress, purpose: z.enum(['sign-in', 'password']), ...tryOrigin }),
	subject: () => Promise.resolve({}),
	async run({ scope, house, input, at, enqueue }) {
		const { email, purpose } = input;
		await countTry(scope, await bucketsOf(scope, house, email, input, 'letter'), at);
		await enqueue({ kind: 'send-account-link', payload: { email, purpose } });
	}
});
