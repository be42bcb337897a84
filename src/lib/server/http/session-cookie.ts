import type { Cookies } from '@sveltejs/kit';

const plain = 'authjs.session-token';

/** Auth.js's own names: the `__Secure-` one wherever the site is served over TLS. */
export function sessionCookieName(origin: string): string {
	return origin.startsWith('https:') ? `__Secure-${plain}` : plain;
}

export function cookieOptions(origin: string, expires: Date) {
	return {
		path: '/',
		httpOnly: true,
		sameSite: 'lax' as const,
		secure: origin.startsWith('https:'),
		expires
	};
}

const deviceCookie = 'ringland-device';

/** A random mark that says "this browser has been here": it holds no identity and no right. */
export function deviceMark(cookies: Cookies, origin: string, chance: (n: number) => Uint8Array) {
	const held = cookies.get(deviceCookie);
	if (held && /^[\w-]{43}$/.test(held)) return held;
	const made = Buffer.from(chance(32)).toString('base64url');
	const inAYear = new Date(Date.now() + 365 * 24 * 3600 * 1000);
	cookies.set(deviceCookie, made, cookieOptions(origin, inAYear));
	return made;
}
