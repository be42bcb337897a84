import type { RequestEvent } from '@sveltejs/kit';
import { exportPublicSheet } from '../services/courses/read-public-sheets';
import type { SheetFileKind } from '../services/courses/sheet-as-file';
import { answered } from './json';

/** A data sheet as a file to keep, for those who may read it alone. */
export function sendSheet(file: { name: string; mediaType: string; text: string }): Response {
	return new Response(file.text, {
		headers: {
			'content-type': file.mediaType,
			'content-disposition': `attachment; filename="${file.name}"`,
			'cache-control': 'private, no-store'
		}
	});
}

/**
 * Something that anybody may keep: asked for again with its tag, the answer is only that it still
 * stands. It is asked for each time, so that a corrected limit is never an old one in a cache.
 */
export function sendPublic(
	request: Request,
	{ text, mediaType, tag }: { text: string; mediaType: string; tag: string }
): Response {
	const headers = {
		'content-type': mediaType,
		'cache-control': 'public, no-cache',
		etag: `"${tag}"`
	};
	const known = (request.headers.get('if-none-match') ?? '').split(/\s*,\s*/);
	return known.some((one) => one.replace(/^W\//, '') === headers.etag)
		? new Response(null, { status: 304, headers })
		: new Response(text, { headers });
}

/** The route of a public sheet's file of one kind. */
export function publicSheetFile(as: SheetFileKind) {
	return (event: RequestEvent): Promise<Response> =>
		answered(event, async () => {
			const asked = { key: event.params.sheet, as };
			const { hash, ...file } = await exportPublicSheet(await event.locals.caller(), asked);
			return sendPublic(event.request, { ...file, tag: `${hash}-${as}` });
		});
}
