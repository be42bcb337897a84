import { createHash } from 'node:crypto';
import { answered } from '$lib/server/http/json';
import { sendPublic } from '$lib/server/http/send-sheet';
import { listPublicSheets } from '$lib/server/services/courses/read-public-sheets';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = (event) =>
	answered(event, async () => {
		const text = JSON.stringify(await listPublicSheets(await event.locals.caller(), {}));
		const tag = createHash('sha256').update(text).digest('hex').slice(0, 32);
		return sendPublic(event.request, { text, mediaType: 'application/json', tag });
	});
