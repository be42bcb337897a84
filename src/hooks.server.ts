import { randomUUID } from 'node:crypto';
import type { HandleServerError, ServerInit } from '@sveltejs/kit';
import { sequence } from '@sveltejs/kit/hooks';
import { authHandle } from '$lib/server/http/auth';
import { startHouse, stopHouse } from '$lib/server/http/boot';
import { headersHandle } from '$lib/server/http/handles/headers';
import { houseHandle, originHandle } from '$lib/server/http/handles/house';
import { limitsHandle } from '$lib/server/http/handles/limits';
import { schoolHandle } from '$lib/server/http/handles/school';

export const init: ServerInit = async () => {
	await startHouse();
	// adapter-node says this once the last open request has been answered.
	process.once('sveltekit:shutdown', () => void stopHouse().then(() => process.exit(0)));
};

export const handle = sequence(
	houseHandle,
	originHandle,
	headersHandle,
	limitsHandle,
	schoolHandle,
	authHandle
);

export const handleError: HandleServerError = ({ error, event, status }) => {
	const id = randomUUID();
	if (status === 404) return { message: 'There is no page at this address.', id };
	event.locals.house?.log.error({ err: error, id, path: event.url.pathname }, 'unexpected');
	return { message: 'Something went wrong here. It was noted under the number below.', id };
};
