import type { Handle } from '@sveltejs/kit';
import { membershipIn } from '$lib/domain/actor';
import { findSchool } from '../../data/queries/schools';
import { commonScope } from '../../data/scope';

/** The school that the address names, for every page and API route inside one. */
export const schoolHandle: Handle = async ({ event, resolve }) => {
	const slug = event.params.school;
	if (slug === undefined) return resolve(event);
	const found = await findSchool(commonScope(event.locals.house.database, null), slug);
	if (found) {
		const { id, name, locale, timeZone } = found;
		event.locals.school = { id, slug, name, locale, timeZone };
		event.locals.membership = membershipIn(await event.locals.actor(), id);
	}
	return resolve(event);
};
