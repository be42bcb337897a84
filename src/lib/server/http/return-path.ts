/** Where to go after signing in: a path of this site, never another one. */
export function returnPath(wanted: string | null, origin: string): string | undefined {
	if (!wanted?.startsWith('/')) return undefined;
	try {
		const url = new URL(wanted, origin);
		// "//elsewhere" and "/\elsewhere" are paths to a person and hosts to a browser.
		if (url.origin !== origin || /^\/(auth|sign-in)(\/|$)/.test(url.pathname)) return undefined;
		return url.pathname + url.search;
	} catch {
		return undefined;
	}
}
