import type { Handle } from '@sveltejs/kit';
import { uploadRoutes } from '../upload-routes';

export const bodyBytesAtMost = 512 * 1024;

/** Thrown into whoever reads a body that turns out longer than it said. */
export class BodyTooLarge extends Error {
	readonly status = 413;
	constructor() {
		super('The body is larger than 512 kB.');
	}
}

/**
 * Holds every body to 512 kB, by its declared length and while it is read; the listed upload
 * routes have limits of their own.
 */
export const bodyLimitHandle: Handle = ({ event, resolve }) => {
	const { request, route } = event;
	if (!request.body || (route.id !== null && uploadRoutes.has(route.id))) return resolve(event);
	if (Number(request.headers.get('content-length') ?? 0) > bodyBytesAtMost)
		return new Response('This is larger than 512 kB. Send less at once.', { status: 413 });
	let seen = 0;
	const counted = request.body.pipeThrough(
		new TransformStream<Uint8Array, Uint8Array>({
			transform(chunk, controller) {
				seen += chunk.byteLength;
				if (seen > bodyBytesAtMost) controller.error(new BodyTooLarge());
				else controller.enqueue(chunk);
			}
		})
	);
	const init: RequestInit & { duplex: 'half' } = { body: counted, duplex: 'half' };
	event.request = new Request(request, init);
	return resolve(event);
};
