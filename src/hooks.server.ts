import { randomUUID } from 'node:crypto';
import type { HandleServerError, ServerInit } from '@sveltejs/kit';
import { sequence } from '@sveltejs/kit/hooks';
import { authHandle } from '$lib/server/http/auth/auth-handle';
import { house, startHouse, stopHouse } from '$lib/server/http/boot';
import { bodyLimitHandle } from '$lib/server/http/handles/body-limit';
import { localsHandle } from '$lib/server/http/handles/locals';
import { ownHostHandle } from '$lib/server/http/handles/own-host';
import { requestLogHandle } from '$lib/server/http/handles/request-log';
import { securityHeadersHandle } from '$lib/server/http/handles/security-headers';

export const init: ServerInit = async () => {
	await startHouse();
	// adapter-node says this once the last open request has been answered.
	process.once('sveltekit:shutdown', () => void stopHouse().then(() => process.exit(0)));
};

export const handle = sequence(
	requestLogHandle(house),
	securityHeadersHandle(house),
	ownHostHandle(house),
	localsHandle(house),
	bodyLimitHandle,
	authHandle
);

/** What nobody expected: noted under a number that the person can name. */
export const handleError: HandleServerError = ({ error, event, status }) => {
	if (status === 404) return { message: 'There is no page at this address.' };
	if (status < 500) return { message: 'This request cannot be taken as it is.' };
	const id = randomUUID();
	const { requestId } = event.locals;
	house().log.error({ err: error, id, requestId, route: event.route.id }, 'unexpected');
	return { message: 'Something went wrong here. It was noted under the number below.', id };
};
