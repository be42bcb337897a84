import { answered } from '$lib/server/http/json';
import { sendSheet } from '$lib/server/http/send-sheet';
import { exportDataSheet } from '$lib/server/services/courses/read-data-sheets';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = (event) =>
	answered(event, async () => {
		const as = event.url.searchParams.get('as') ?? 'csv';
		return sendSheet(
			await exportDataSheet(await event.locals.caller(), { key: event.params.sheet, as })
		);
	});
