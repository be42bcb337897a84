import type { Handle, RequestEvent } from '@sveltejs/kit';
import { anyone, system, type Actor } from '$lib/domain/actor';
import { Problem } from '$lib/domain/problem';
import { schoolAtAddress } from '../../services/accounts/find-school';
import {
	noteApiTokenUsed,
	noteSessionSeen,
	whoHoldsApiToken,
	whoHoldsSession
} from '../../services/accounts/who-asks';
import type { House } from '../../services/house';
import { cookieName } from '../auth/cookies';

const seenEveryMs = 10 * 60_000;

/** What every route finds in `locals`. Who asks is looked up once, when somebody wants to know. */
export function localsHandle(house: () => House): Handle {
	return async ({ event, resolve }) => {
		const here = house();
		let actor: Promise<Actor> | undefined;
		event.locals.house = here;
		event.locals.actor = () => (actor ??= whoAsks(event));
		event.locals.caller = async (requestKey) => {
			const { school } = event.locals;
			if (event.params.school !== undefined && !school)
				throw new Problem('absent', 'There is no school at this address.');
			return { house: here, actor: await event.locals.actor(), schoolId: school?.id, requestKey };
		};
		const slug = event.params.school;
		if (slug !== undefined)
			event.locals.school = (await schoolAtAddress(byAnyone(here), { slug })) ?? undefined;
		return resolve(event);
	};
}

/** A script by its bearer token, on the API alone; a person by the session cookie. */
async function whoAsks(event: RequestEvent): Promise<Actor> {
	const { house } = event.locals;
	const authorization = event.request.headers.get('authorization') ?? '';
	const bearer = /^Bearer\s+(\S+)\s*$/i.exec(authorization)?.[1];
	if (bearer && event.url.pathname.startsWith('/api/')) return whichScript(house, bearer);
	const token = event.cookies.get(cookieName(house.config.ORIGIN, 'session'));
	if (!token) return anyone;
	const { actor, seenAt } = await whoHoldsSession(byAnyone(house), { token });
	if (actor.kind === 'account' && isLongAgo(house, seenAt))
		await noteSessionSeen({ house, actor, schoolId: undefined }, {});
	return actor;
}

async function whichScript(house: House, token: string): Promise<Actor> {
	const { actor, lastUsedAt } = await whoHoldsApiToken(byAnyone(house), { token });
	if (isLongAgo(house, lastUsedAt)) {
		const { tokenId } = actor;
		await noteApiTokenUsed({ house, actor: system, schoolId: undefined }, { tokenId });
	}
	return actor;
}

/** Often enough to be told apart, seldom enough to cost nothing. */
function isLongAgo(house: House, at: string | null): boolean {
	return at === null || house.now().getTime() - Date.parse(at) > seenEveryMs;
}

function byAnyone(house: House) {
	return { house, actor: anyone, schoolId: undefined };
}
