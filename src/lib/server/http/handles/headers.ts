import type { Handle } from '@sveltejs/kit';

const always = {
	'x-content-type-options': 'nosniff',
	'referrer-policy': 'strict-origin-when-cross-origin',
	'permissions-policy': 'camera=(self), geolocation=(), microphone=(), payment=(), usb=()',
	'cross-origin-opener-policy': 'same-origin',
	'x-frame-options': 'DENY'
};

/** The usual headers, and `form-action`, which must let the browser go on to the till. */
export const headersHandle: Handle = async ({ event, resolve }) => {
	const response = await resolve(event);
	const { headers } = response;
	const { ORIGIN, TILL_ORIGIN } = event.locals.house.config;
	for (const [name, value] of Object.entries(always)) headers.set(name, value);
	if (ORIGIN.startsWith('https:'))
		headers.set('strict-transport-security', 'max-age=63072000; includeSubDomains');
	const policy = headers.get('content-security-policy');
	if (policy)
		headers.set('content-security-policy', `${policy}; form-action 'self' ${TILL_ORIGIN}`);
	// What a school's page shows must not lie in a shared computer's cache.
	const inside = event.url.pathname.startsWith('/s/') || event.url.pathname.startsWith('/account');
	if (inside && !headers.has('cache-control')) headers.set('cache-control', 'private, no-store');
	return response;
};
