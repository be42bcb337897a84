import type { Handle } from '@sveltejs/kit';
import type { House } from '../../services/house';

const always = {
	'x-content-type-options': 'nosniff',
	// A one-time link stands in the address of some pages: it goes to no other site, nor in part.
	'referrer-policy': 'same-origin',
	'permissions-policy': 'camera=(self), geolocation=(), microphone=(), payment=(), usb=()',
	'cross-origin-opener-policy': 'same-origin',
	'x-frame-options': 'DENY'
};

const lone = "default-src 'none'; frame-ancestors 'none'; sandbox";

/** Pages that are somebody's own: they must not lie in the cache of a shared computer. */
const personal = /^\/(s|account|sign-in|password|invitation|joining|first-school|auth|api)(\/|$)/;

/** The usual headers on every answer, and what the page's own policy cannot know when built. */
export function securityHeadersHandle(house: () => House): Handle {
	return async ({ event, resolve }) => {
		const { ORIGIN, TILL_ORIGIN } = house().config;
		const answer = await resolve(event);
		const open = new Response(answer.body, answer);
		const { headers } = open;
		for (const [name, value] of Object.entries(always)) headers.set(name, value);
		if (ORIGIN.startsWith('https:')) headers.set('strict-transport-security', 'max-age=63072000');
		// A page's forms lead to this site, and one of them on to the till.
		const policy = headers.get('content-security-policy');
		if (policy)
			headers.set('content-security-policy', `${policy}; form-action 'self' ${TILL_ORIGIN}`);
		// Anything else that is opened by itself runs nothing; browsers show a PDF only without this.
		else if (headers.get('content-type') !== 'application/pdf')
			headers.set('content-security-policy', lone);
		if (personal.test(event.url.pathname) && !headers.has('cache-control'))
			headers.set('cache-control', 'private, no-store');
		return open;
	};
}
