import type { Handle } from '@sveltejs/kit';

export const bodyBytesAtMost = 512 * 1024;

/** These stream to the disk within limits of their own and never call `formData()`. */
export const uploadRoutes = new Set([
	'/api/v1/schools/[school]/submissions/[submission]/photographs'
]);

/**
 * Holds every other body to 512 kB: by its declared length, and while it is read when it has
 * none or lies about it.
 */
export const limitsHandle: Handle = ({ event, resolve }) => {
	const { request, route } = event;
	if (!request.body || (route.id && uploadRoutes.has(route.id))) return resolve(event);
	const declared = Number(request.headers.get('content-length') ?? 0);
	if (declared > bodyBytesAtMost) return tooLarge();
	let seen = 0;
	const counted = request.body.pipeThrough(
		new TransformStream<Uint8Array, Uint8Array>({
			transform(chunk, controller) {
				seen += chunk.byteLength;
				if (seen > bodyBytesAtMost) controller.error(new Error('body too large'));
				else controller.enqueue(chunk);
			}
		})
	);
	event.request = new Request(request, { body: counted, duplex: 'half' } as RequestInit);
	return resolve(event);
};

function tooLarge(): Response {
	return new Response('This is too large. Send at most 512 kB.', { status: 413 });
}
