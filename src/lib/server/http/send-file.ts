import { Readable } from 'node:stream';
import type { RequestEvent } from '@sveltejs/kit';
import type { House } from '../services/house';

type Found = { key: string; mediaType: string; bytes: number; sha256: string };

/** Answers with a stored file or the part of it that Range asks for (RFC 9110, 14). */
export async function sendFile(event: RequestEvent, house: House, file: Found): Promise<Response> {
	const headers: Record<string, string> = {
		'content-type': file.mediaType,
		'accept-ranges': 'bytes',
		// Content under a hash never changes; private, because not everybody may see it.
		'cache-control': 'private, max-age=86400, immutable',
		etag: `"${file.sha256}"`,
		'content-security-policy': "default-src 'none'; sandbox"
	};
	if (event.request.headers.get('if-none-match') === headers.etag)
		return new Response(null, { status: 304, headers });
	const asked = event.request.headers.get('range');
	const range = asked === null ? null : readRange(asked, file.bytes);
	if (range === 'unsatisfiable')
		return new Response(null, {
			status: 416,
			headers: { ...headers, 'content-range': `bytes */${file.bytes}` }
		});
	const { stream, part } = await house.gateways.storage.open(file.key, range ?? undefined);
	const body = Readable.toWeb(stream) as ReadableStream<Uint8Array>;
	return new Response(body, {
		status: range ? 206 : 200,
		headers: {
			...headers,
			'content-length': String(part.end - part.start + 1),
			...(range ? { 'content-range': `bytes ${part.start}-${part.end}/${file.bytes}` } : {})
		}
	});
}

/** One range only; anything else is answered with the whole file, as the standard allows. */
export function readRange(
	asked: string,
	bytes: number
): { start: number; end: number } | 'unsatisfiable' | null {
	const found = /^bytes=(\d*)-(\d*)$/.exec(asked.trim());
	if (!found) return null;
	const [, from = '', to = ''] = found;
	if (from === '' && to === '') return null;
	const start = from === '' ? Math.max(0, bytes - Number(to)) : Number(from);
	const end = from === '' || to === '' ? bytes - 1 : Math.min(Number(to), bytes - 1);
	return start >= bytes || start > end ? 'unsatisfiable' : { start, end };
}
