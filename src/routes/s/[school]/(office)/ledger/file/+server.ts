import { answered } from '$lib/server/http/json';
import { exportLedger } from '$lib/server/services/office/read-records';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = (event) =>
	answered(event, async () => {
		const { fileName, text } = await exportLedger(await event.locals.caller(), {});
		return new Response(text, {
			headers: {
				'content-type': 'application/jsonl; charset=utf-8',
				'content-disposition': `attachment; filename="${fileName}"`,
				'cache-control': 'private, no-store'
			}
		});
	});
