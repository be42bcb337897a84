import type { RequestEvent } from '@sveltejs/kit';
import { system } from '$lib/domain/actor';
import { openSession } from '../../services/accounts/open-session';
import { cookieName, cookieOptions } from './cookies';
import { keepDeviceMark } from './device-mark';

/** Opens a session in the database. Only the browser keeps the token that this returns. */
export async function startSession(event: RequestEvent, accountId: string, token?: string) {
	const { house } = event.locals;
	const made = token ?? newSessionToken(event);
	const { hash: deviceHash } = keepDeviceMark(event);
	const { expiresAt } = await openSession(
		{ house, actor: system, schoolId: undefined },
		{
			accountId,
			token: made,
			tokenBefore: event.cookies.get(cookieName(house.config.ORIGIN, 'session')) ?? null,
			userAgent: event.request.headers.get('user-agent'),
			address: event.getClientAddress(),
			deviceHash
		}
	);
	return { token: made, expires: new Date(expiresAt) };
}

/**
 * Signs somebody in who has just proven in another way who they are: a new person who followed
 * an invitation, the first admin.
 */
export async function signInAs(event: RequestEvent, accountId: string): Promise<void> {
	const { ORIGIN } = event.locals.house.config;
	const { token, expires } = await startSession(event, accountId);
	event.cookies.set(cookieName(ORIGIN, 'session'), token, { ...cookieOptions(ORIGIN), expires });
}

export function newSessionToken(event: RequestEvent): string {
	return Buffer.from(event.locals.house.chance(32)).toString('base64url');
}
