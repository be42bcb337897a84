/** `__Host-` ties a cookie to this host, this path and TLS; plain HTTP (loopback) cannot have it. */
export function cookieName(origin: string, name: 'session' | 'device' | 'return'): string {
	return `${isSecure(origin) ? '__Host-' : ''}ringland-${name}`;
}

export function cookieOptions(origin: string) {
	return { path: '/', httpOnly: true, sameSite: 'lax' as const, secure: isSecure(origin) };
}

export function isSecure(origin: string): boolean {
	return origin.startsWith('https:');
}
