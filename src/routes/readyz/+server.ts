import { readReady } from '$lib/server/services/schools/ready';
import type { RequestHandler } from './$types';

/** The database answers as well: send people here. */
export const GET: RequestHandler = async ({ locals }) => {
	const headers = { 'cache-control': 'no-store' };
	try {
		await readReady(await locals.caller(), {});
		return new Response('ready\n', { headers });
	} catch (error) {
		locals.house.log.error({ err: error }, 'not ready');
		return new Response('not ready\n', { status: 503, headers });
	}
};
