import { Auth, raw, skipCSRFCheck } from '@auth/core';
import type { RequestEvent } from '@sveltejs/kit';
import { Problem } from '$lib/domain/problem';
import { authConfig } from './config';
import { problemIn } from './refused';

/**
 * Asks Auth.js from one of our own pages as its routes would be asked, and sets the cookies
 * that it answers with.
 * @throws Problem where a password was wrong, a wait is on, or a link does not stand
 */
async function askAuth(event: RequestEvent, path: string, body?: Record<string, string>) {
	const { ORIGIN } = event.locals.house.config;
	const headers = new Headers({ cookie: event.request.headers.get('cookie') ?? '' });
	if (body) headers.set('content-type', 'application/x-www-form-urlencoded');
	const request = new Request(`${ORIGIN}/auth/${path}`, {
		method: body ? 'POST' : 'GET',
		headers,
		body: body && new URLSearchParams({ ...body, callbackUrl: ORIGIN })
	});
	try {
		const answer = await Auth(request, { ...authConfig(event), skipCSRFCheck, raw });
		for (const { name, value, options } of answer.cookies ?? [])
			event.cookies.set(name, value, { path: '/', ...options });
	} catch (error) {
		const problem = problemIn(error);
		if (problem) throw problem;
		if (error instanceof Error && error.name === 'Verification')
			throw new Problem('closed', 'This link was used already or is too old. Ask for a new one.');
		throw error;
	}
}

export function signInWithPassword(event: RequestEvent, email: string, password: string) {
	return askAuth(event, 'callback/password', { email, password });
}

export function askForSignInLink(event: RequestEvent, email: string) {
	return askAuth(event, 'signin/link', { email });
}

export function signInWithLink(event: RequestEvent, token: string) {
	return askAuth(event, `callback/link?${new URLSearchParams({ token }).toString()}`);
}

export function signOut(event: RequestEvent) {
	return askAuth(event, 'signout', {});
}
