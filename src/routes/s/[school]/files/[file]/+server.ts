import { answered } from '$lib/server/http/json';
import { sendFile } from '$lib/server/http/send-file';
import { readOriginal, readPhotographCopy } from '$lib/server/services/submissions/read-file';
import type { RequestHandler } from './$types';

/** A photograph's clean copy; with `?original`, for a verifier, the file as it was sent in. */
export const GET: RequestHandler = (event) =>
	answered(event, async () => {
		const read = event.url.searchParams.has('original') ? readOriginal : readPhotographCopy;
		const file = await read(await event.locals.caller(), { fileId: event.params.file });
		return sendFile(event, event.locals.house, file);
	});
