import { randomUUID } from 'node:crypto';
import type { Handle } from '@sveltejs/kit';
import type { House } from '../../services/house';

/**
 * One line a request. It names the route, never the address: one-time links carry their token
 * in it.
 */
export function requestLogHandle(house: () => House): Handle {
	return async ({ event, resolve }) => {
		const { log } = house();
		const begun = performance.now();
		event.locals.requestId = randomUUID();
		const response = await resolve(event);
		log.debug(
			{
				requestId: event.locals.requestId,
				method: event.request.method,
				route: event.route.id,
				status: response.status,
				ms: Math.round(performance.now() - begun)
			},
			'request'
		);
		return response;
	};
}
