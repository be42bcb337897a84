import { SvelteKitAuth } from '@auth/sveltekit';
import type { Handle, RequestEvent } from '@sveltejs/kit';
import { authConfig } from './config';
import { keepDeviceMark } from './device-mark';

const { handle } = SvelteKitAuth((event) => Promise.resolve(authConfig(event as RequestEvent)));

/**
 * Auth.js's own routes, and nothing else through it: who asks is our own query. Two things are
 * shut: a link that signs in by being opened (mail scanners open links; our page has a button),
 * and a write that comes from elsewhere, whatever its content type.
 */
export const authHandle: Handle = async (given) => {
	const { event, resolve } = given;
	if (!event.url.pathname.startsWith('/auth/')) return resolve(event);
	const { method, headers } = event.request;
	const opensLink = method !== 'POST' && event.url.pathname.startsWith('/auth/callback/');
	if (opensLink) return new Response('Use the page that the link opens.', { status: 405 });
	if (method === 'POST' && headers.get('origin') !== event.locals.house.config.ORIGIN)
		return new Response('This request comes from another site.', { status: 403 });
	const answer = await handle(given);
	if (!event.locals.keptDevice) return answer;
	// kit adds cookies to answers of routes only; this one was made past them.
	const open = new Response(answer.body, answer);
	open.headers.append('set-cookie', keepDeviceMark(event).setCookie);
	return open;
};
