import { error, isHttpError, type Handle } from '@sveltejs/kit';
import { Problem } from '$lib/domain/problem';
import { problemResponse } from '../problem';
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
	if (Number(request.headers.get('content-length') ?? 0) > bodyBytesAtMost) {
		void letPass(request.body.getReader());
		return event.url.pathname.startsWith('/api/')
			? problemResponse(event, new Problem('too-large', tooLarge))
			: new Response(tooLarge, { status: 413 });
	}
	const init: RequestInit & { duplex: 'half' } = { body: held(request.body), duplex: 'half' };
	event.request = new Request(request, init);
	return resolve(event);
};

/** The same bytes, until they are too many; then the reader is told. */
function held(body: ReadableStream<Uint8Array>): ReadableStream<Uint8Array> {
	const source = body.getReader();
	let seen = 0;
	return new ReadableStream<Uint8Array>({
		async pull(controller) {
			const { done, value } = await source.read();
			if (done) return controller.close();
			seen += value.byteLength;
			if (seen <= bodyBytesAtMost) return controller.enqueue(value);
			controller.error(bodyTooLarge());
			void letPass(source);
		},
		cancel: (reason) => source.cancel(reason)
	});
}

/**
 * Reads on for a while without keeping anything: a sender whose line is cut while it still
 * sends never sees the answer.
 */
async function letPass(source: ReadableStreamDefaultReader<Uint8Array>): Promise<void> {
	let left = 8 * bodyBytesAtMost;
	try {
		while (left > 0) {
			const { done, value } = await source.read();
			if (done) return;
			left -= value.byteLength;
		}
		await source.cancel();
	} catch {
		// The sender went away: nothing is left to read.
	}
}
