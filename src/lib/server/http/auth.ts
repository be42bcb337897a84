import { Auth, raw, skipCSRFCheck } from '@auth/core';
import type { Adapter } from '@auth/core/adapters';
import type { EmailConfig } from '@auth/core/providers/email';
import { SvelteKitAuth, type SvelteKitAuthConfig } from '@auth/sveltekit';
import Credentials from '@auth/sveltekit/providers/credentials';
import type { RequestEvent } from '@sveltejs/kit';
import { system } from '$lib/domain/actor';
import { Problem } from '$lib/domain/problem';
import {
	accountByEmail,
	accountById,
	actorOfSession,
	endSessionByToken
} from '../data/queries/accounts';
import { commonScope } from '../data/scope';
import { inTransaction } from '../data/transaction';
import { sendSignInLink, useSignInLink } from '../services/accounts/link-sign-in';
import { beginSession } from '../services/accounts/sessions';
import { checkPassword, countFailure } from '../services/accounts/sign-in';
import type { House } from '../services/house';
import { deviceMark, sessionCookieName } from './session-cookie';

const byTheSystem = (house: House) => ({ house, actor: system, schoolId: undefined });

/** What Auth.js needs of an adapter here, over our own services: hashed tokens, one queue. */
function adapterFor(event: RequestEvent): Adapter {
	const { house } = event.locals;
	const scope = commonScope(house.database, null);
	const asUser = (one: { id: string; email: string; name: string }) => ({
		id: one.id,
		email: one.email,
		name: one.name,
		emailVerified: null
	});
	return {
		// Accounts are made by invitations and by the office; nobody makes one by signing in.
		createUser: () => Promise.reject(new Error('accounts are made by invitation')),
		getUser: async (id) => {
			const found = await accountById(scope, id);
			return found ? asUser(found) : null;
		},
		getUserByEmail: async (email) => {
			const found = await accountByEmail(scope, email);
			return found ? asUser(found) : null;
		},
		getUserByAccount: () => Promise.resolve(null),
		updateUser: async (user) => {
			const found = await accountById(scope, user.id);
			if (!found) throw new Error('no such account');
			return asUser(found);
		},
		linkAccount: () => Promise.reject(new Error('there are no outside accounts')),
		async createSession({ sessionToken, userId }) {
			const { expiresAt } = await startSession(event, userId, sessionToken);
			return { sessionToken, userId, expires: new Date(expiresAt) };
		},
		async getSessionAndUser(sessionToken) {
			const actor = await actorOfSession(scope, sessionToken, house.now());
			if (actor.kind !== 'account') return null;
			const { accountId, email, name } = actor;
			const expires = new Date(house.now().getTime() + 24 * 3600 * 1000);
			return {
				session: { sessionToken, userId: accountId, expires },
				user: asUser({ id: accountId, email, name })
			};
		},
		updateSession: () => Promise.resolve(null),
		async deleteSession(sessionToken) {
			await inTransaction(house.database, (transaction) =>
				endSessionByToken(commonScope(house.database, transaction), sessionToken)
			);
		},
		// Links are made by `sendSignInLink`, under a token of its own; Auth.js only uses them up.
		createVerificationToken: (token) => Promise.resolve(token),
		async useVerificationToken({ identifier, token }) {
			const { account } = await useSignInLink(byTheSystem(house), { tokenHash: token });
			if (!account || account.email !== identifier) return null;
			return { identifier, token, expires: new Date(house.now().getTime() + 60_000) };
		}
	};
}

/** Begins a session in the database, under a token that only the browser keeps. */
export async function startSession(event: RequestEvent, accountId: string, token: string) {
	const { house } = event.locals;
	return beginSession(byTheSystem(house), {
		accountId,
		token,
		device: deviceMark(event.cookies, house.config.ORIGIN, house.chance),
		userAgent: event.request.headers.get('user-agent'),
		address: event.getClientAddress()
	});
}

export function newSessionToken(house: House): string {
	return Buffer.from(house.chance(32)).toString('base64url');
}

function configFor(event: RequestEvent): SvelteKitAuthConfig {
	const { house } = event.locals;
	const email: EmailConfig = {
		id: 'email',
		type: 'email',
		name: 'E-mail',
		maxAge: 20 * 60,
		from: house.config.MAIL_FROM,
		server: {},
		options: {},
		// Auth.js hashes token and secret together; without one its hash is the one that we keep.
		secret: '',
		sendVerificationRequest: async ({ identifier }) => {
			await sendSignInLink(
				{ house, actor: { kind: 'anyone' }, schoolId: undefined },
				{ email: identifier }
			);
		}
	} as EmailConfig;
	const secure = house.config.ORIGIN.startsWith('https:');
	return {
		secret: Buffer.from(house.gateways.signing.keyFor('auth.js')).toString('base64url'),
		trustHost: true,
		basePath: '/auth',
		useSecureCookies: secure,
		adapter: adapterFor(event),
		session: { strategy: 'database', generateSessionToken: () => newSessionToken(house) },
		pages: {
			signIn: '/sign-in',
			error: '/sign-in',
			verifyRequest: '/sign-in/sent',
			signOut: '/account'
		},
		providers: [
			email,
			Credentials({
				credentials: { email: {}, password: {} },
				authorize: (given) => authorize(event, given)
			})
		],
		callbacks: {
			// Only fields that the browser may know; the token stays out.
			session: ({ session }) => ({ user: session.user, expires: session.expires }) as never,
			jwt: ({ token, user, account }) =>
				account?.provider === 'credentials' ? { ...token, accountId: user.id } : token
		},
		jwt: {
			// Credentials would get a signed cookie; here they get a row and its token like everybody.
			async encode({ token }) {
				const accountId = token?.accountId;
				if (typeof accountId !== 'string') throw new Error('no account to begin a session for');
				const made = newSessionToken(house);
				await startSession(event, accountId, made);
				return made;
			},
			decode: () => Promise.resolve(null)
		},
		logger: {
			error: (error) => {
				if (!(problemIn(error) || error.name === 'CredentialsSignin'))
					house.log.error({ err: error, requestId: event.locals.requestId }, 'auth');
			},
			warn: () => undefined,
			debug: () => undefined
		}
	};
}

async function authorize(event: RequestEvent, given: Partial<Record<string, unknown>>) {
	const { house } = event.locals;
	const from = {
		address: event.getClientAddress(),
		device: deviceMark(event.cookies, house.config.ORIGIN, house.chance)
	};
	const anyone = { house, actor: { kind: 'anyone' } as const, schoolId: undefined };
	const { accountId } = await checkPassword(anyone, { ...given, ...from });
	if (accountId !== null) {
		const account = await accountById(commonScope(house.database, null), accountId);
		return account ? { id: account.id, email: account.email, name: account.name } : null;
	}
	await countFailure(anyone, {
		accountKey: String(given.email).trim().toLowerCase(),
		address: from.address
	});
	return null;
}

/** Auth.js wraps what its callbacks throw; ours are looked for inside. */
function problemIn(error: unknown): Problem | undefined {
	if (error instanceof Problem) return error;
	const cause = error instanceof Error ? (error.cause as { err?: unknown } | undefined) : undefined;
	return cause?.err ? problemIn(cause.err) : cause instanceof Problem ? cause : undefined;
}

/** Auth.js's own routes under /auth/. */
export const { handle: authHandle } = SvelteKitAuth(async (event) =>
	Promise.resolve(configFor(event as RequestEvent))
);

/**
 * Asks Auth.js from one of our own pages, as its routes would be asked, and sets the cookies
 * that it answers with. @throws Problem where a password was wrong or a wait is on
 */
async function throughAuth(event: RequestEvent, path: string, body?: Record<string, string>) {
	const { ORIGIN } = event.locals.house.config;
	const headers = new Headers({ cookie: event.request.headers.get('cookie') ?? '' });
	if (body) headers.set('content-type', 'application/x-www-form-urlencoded');
	const request = new Request(`${ORIGIN}/auth/${path}`, {
		method: body ? 'POST' : 'GET',
		headers,
		body: body && new URLSearchParams({ ...body, callbackUrl: ORIGIN })
	});
	try {
		const answer = await Auth(request, { ...configFor(event), skipCSRFCheck, raw });
		for (const one of answer.cookies ?? [])
			event.cookies.set(one.name, one.value, { path: '/', ...one.options });
		return answer.redirect ?? '';
	} catch (error) {
		const problem = problemIn(error);
		if (problem) throw problem;
		if (error instanceof Error && error.name === 'CredentialsSignin')
			throw new Problem('input', 'The address and the password do not go together.');
		throw error;
	}
}

export async function signInWithPassword(event: RequestEvent, email: string, password: string) {
	await throughAuth(event, 'callback/credentials', { email, password });
}

/** Uses a mailed link up. @returns whether it stood */
export async function signInWithLink(event: RequestEvent, token: string, email: string) {
	const query = new URLSearchParams({
		token,
		email,
		callbackUrl: event.locals.house.config.ORIGIN
	});
	const next = await throughAuth(event, `callback/email?${query.toString()}`);
	return !next.includes('error=');
}

export async function signOut(event: RequestEvent) {
	await throughAuth(event, 'signout', {});
	event.cookies.delete(sessionCookieName(event.locals.house.config.ORIGIN), { path: '/' });
}
