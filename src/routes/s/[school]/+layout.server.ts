import { load as ask } from '$lib/server/http/page';
import { readSchool } from '$lib/server/services/accounts/read-school';
import type { LayoutServerLoad } from './$types';

/** Nobody else's school has a page here. Each page asks for itself as well: this is not the lock. */
export const load: LayoutServerLoad = async (event) => {
	const { school, roles } = await ask(event, readSchool);
	return { place: school, roles };
};
