import type { EmailConfig } from '@auth/core/providers/email';
import Credentials from '@auth/core/providers/credentials';
import type { AuthConfig } from '@auth/core';
import type { RequestEvent } from '@sveltejs/kit';
import { lifetimes } from '$lib/domain/accounts/lifetimes';
import { anyone } from '$lib/domain/actor';
import { askForLink } from '../../services/accounts/ask-for-link';
import { sessionHeldForMs } from '../../services/accounts/open-session';
import { tryPassword } from '../../services/accounts/sign-in';
import { adapterFor } from './adapter';
import { cookieName, cookieOptions, isSecure } from './cookies';
import { readDeviceMark } from './device-mark';
import { problemIn, Refused } from './refused';
import { newSessionToken, startSession } from './start-session';

/** Auth.js for one request: its callbacks need to know from where it comes. */
export function authConfig(event: RequestEvent) {
	const { house } = event.locals;
	const { ORIGIN, AUTH_SECRET } = house.config;
	const options = cookieOptions(ORIGIN);
	return {
		secret: AUTH_SECRET ?? Buffer.from(house.gateways.signing.keyFor('auth')).toString('base64url'),
		trustHost: true,
		basePath: '/auth',
		useSecureCookies: isSecure(ORIGIN),
		cookies: {
			sessionToken: { name: cookieName(ORIGIN, 'session'), options },
			callbackUrl: { name: cookieName(ORIGIN, 'return'), options }
		},
		adapter: adapterFor(event),
		session: {
			strategy: 'database',
			maxAge: sessionHeldForMs / 1000,
			generateSessionToken: () => newSessionToken(event)
		},
		pages: { signIn: '/sign-in', error: '/sign-in', verifyRequest: '/sign-in/link' },
		providers: [linkByMail(event), password(event)],
		callbacks: {
			// The adapter's session carries its token; the browser gets these fields and no others.
			session: ({ session }) => ({
				user: { name: session.user.name, email: session.user.email },
				expires: session.expires
			}),
			jwt: ({ token, user, account }) =>
				account?.type === 'credentials' ? { ...token, accountId: user.id } : token
		},
		// Auth.js gives a password sign-in a signed cookie of its own; here it gets a row like any other.
		jwt: {
			async encode({ token }) {
				const accountId = token?.accountId;
				if (typeof accountId !== 'string') throw new Error('no account to open a session for');
				return (await startSession(event, accountId)).token;
			},
			decode: () => Promise.resolve(null)
		},
		logger: {
			error(error) {
				const known = problemIn(error) ?? ['AccessDenied', 'Verification'].includes(error.name);
				if (!known) house.log.error({ err: error, requestId: event.locals.requestId }, 'auth');
			},
			warn: () => undefined,
			debug: () => undefined
		}
	} satisfies AuthConfig;
}

function password(event: RequestEvent) {
	return Credentials({
		id: 'password',
		name: 'Password',
		credentials: { email: {}, password: {} },
		async authorize(given) {
			try {
				const text = (value: unknown) => (typeof value === 'string' ? value : '');
				const { accountId, name } = await tryPassword(callerOf(event), {
					email: text(given.email),
					password: text(given.password),
					...tryOriginOf(event)
				});
				return { id: accountId, name };
			} catch (error) {
				const problem = problemIn(error);
				throw problem ? new Refused(problem) : error;
			}
		}
	});
}

function linkByMail(event: RequestEvent): EmailConfig {
	return {
		id: 'link',
		type: 'email',
		name: 'Link by e-mail',
		from: event.locals.house.config.MAIL_FROM,
		maxAge: lifetimes.signInLinkMinutes * 60,
		// Auth.js hashes token and secret together; without one, its hash is the one that we keep.
		secret: '',
		options: {},
		async sendVerificationRequest({ identifier }) {
			const asked = { email: identifier, purpose: 'sign-in', ...tryOriginOf(event) };
			await askForLink(callerOf(event), asked);
		}
	};
}

export function tryOriginOf(event: RequestEvent) {
	return { address: event.getClientAddress(), deviceHash: readDeviceMark(event) };
}

function callerOf(event: RequestEvent) {
	return { house: event.locals.house, actor: anyone, schoolId: undefined };
}
