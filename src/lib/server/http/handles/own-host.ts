import type { Handle } from '@sveltejs/kit';
import type { House } from '../../services/house';

/**
 * Cookies, links and the origin check belong to one host: a request under another is sent
 * there. Behind a proxy that is configured (ADDRESS_HEADER), the host is the one it was asked for.
 */
export function ownHostHandle(house: () => House): Handle {
	return ({ event, resolve }) => {
		const { ORIGIN, ADDRESS_HEADER } = house().config;
		const { headers, method } = event.request;
		const forwarded = ADDRESS_HEADER ? headers.get('x-forwarded-host') : null;
		const asked = (forwarded ?? headers.get('host'))?.toLowerCase();
		const isProbe = event.url.pathname === '/healthz' || event.url.pathname === '/readyz';
		if (!asked || isProbe || asked === new URL(ORIGIN).host) return resolve(event);
		if (method !== 'GET' && method !== 'HEAD')
			return new Response(`Use ${ORIGIN}.`, { status: 421 });
		const location = ORIGIN + event.url.pathname + event.url.search;
		return new Response(null, { status: 307, headers: { location, 'cache-control': 'no-store' } });
	};
}
