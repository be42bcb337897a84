import { randomUUID } from 'node:crypto';
import { redirect, type Handle } from '@sveltejs/kit';
import { anyone, type Actor } from '$lib/domain/actor';
import { actorOfSession } from '../../data/queries/accounts';
import { actorOfBearer } from '../../data/queries/api-tokens';
import { commonScope } from '../../data/scope';
import { house } from '../boot';
import { sessionCookieName } from '../session-cookie';

/** Puts the house into the request: who asks is found out once, when somebody wants to know. */
export const houseHandle: Handle = ({ event, resolve }) => {
	const here = house();
	let actor: Promise<Actor> | undefined;
	event.locals.house = here;
	event.locals.requestId = randomUUID();
	event.locals.actor = () => (actor ??= whoAsks());
	event.locals.caller = async (requestKey) => ({
		house: here,
		actor: await event.locals.actor(),
		schoolId: event.locals.school?.id,
		requestKey
	});
	return resolve(event);

	function whoAsks(): Promise<Actor> {
		const scope = commonScope(here.database, null);
		const bearer = /^Bearer (\S+)$/.exec(event.request.headers.get('authorization') ?? '')?.[1];
		if (bearer) return actorOfBearer(scope, bearer);
		const token = event.cookies.get(sessionCookieName(here.config.ORIGIN));
		return token ? actorOfSession(scope, token, here.now()) : Promise.resolve(anyone);
	}
};

/** Links, cookies and passkeys belong to one host: a request under another is sent there. */
export const originHandle: Handle = ({ event, resolve }) => {
	const { ORIGIN } = event.locals.house.config;
	const asked = event.request.headers.get('host');
	const probe = /^\/(healthz|readyz)$/.test(event.url.pathname);
	if (asked && asked !== new URL(ORIGIN).host && !probe) {
		const readOnly = event.request.method === 'GET' || event.request.method === 'HEAD';
		if (!readOnly) return new Response('Use ' + ORIGIN, { status: 421 });
		redirect(307, ORIGIN + event.url.pathname + event.url.search);
	}
	return resolve(event);
};
