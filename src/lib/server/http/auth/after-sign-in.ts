import type { RequestEvent } from '@sveltejs/kit';
import { returnPath } from '../return-path';

/**
 * Where somebody goes who has just signed in: back to what asked for it, or to the door of
 * their school, which knows where their day begins.
 */
export function afterSignIn(event: RequestEvent): string {
	const { ORIGIN } = event.locals.house.config;
	return returnPath(event.url.searchParams.get('to'), ORIGIN) ?? '/home';
}
