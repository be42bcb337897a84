import type { RequestHandler } from './$types';

/** The process runs and answers. */
export const GET: RequestHandler = () =>
	new Response('ok\n', { headers: { 'cache-control': 'no-store' } });
