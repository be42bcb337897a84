import { error, isHttpError, type Handle } from '@sveltejs/kit';
import { uploadRoutes } from '../upload-routes';

export const bodyBytesAtMost = 512 * 1024;

const tooLarge = 'This is larger than 512 kB. Send less at once.';

/** What is thrown into whoever reads a body that turns out longer than it said: kit answers 413. */
function bodyTooLarge(): unknown {
	try {
		error(413, tooLarge);
	} catch (thrown) {
		return thrown;
	}
}

/** Some readers of a body wrap what stopped it. */
export function isTooLarge(thrown: unknown): boolean {
	const cause = thrown instanceof Error ? thrown.cause : undefined;
	return isHttpError(thrown, 413) || isHttpError(cause, 413);
}

/**
 * Holds every body to 512 kB, by its declared length and while it is read; the listed upload
 * routes have limits of their own.
 */
export const bodyLimitHandle: Handle = ({ event, resolve }) => {
	const { request, route } = event;
	if (!request.body || (route.id !== null && uploadRoutes.has(route.id))) return resolve(event);
	if (Number(request.headers.get('content-length') ?? 0) > bodyBytesAtMost)
		return new Response(tooLarge, { status: 413 });
	let seen = 0;
	const counted = request.body.pipeThrough(
		new TransformStream<Uint8Array, Uint8Array>({
			transform(chunk, controller) {
				seen += chunk.byteLength;
				if (seen > bodyBytesAtMost) controller.error(bodyTooLarge());
				else controller.enqueue(chunk);
			}
		})
	);
	const init: RequestInit & { duplex: 'half' } = { body: counted, duplex: 'half' };
	event.request = new Request(request, init);
	return resolve(event);
};
