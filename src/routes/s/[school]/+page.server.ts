import { redirect } from '@sveltejs/kit';
import { firstPage } from '$lib/domain/accounts/rail';
import { load as ask } from '$lib/server/http/page';
import { readSchool } from '$lib/server/services/accounts/read-school';
import type { PageServerLoad } from './$types';

/** The school's door: on to where the person's day begins. */
export const load: PageServerLoad = async (event) => {
	const { school, roles } = await ask(event, readSchool);
	redirect(303, `/s/${school.slug}/${firstPage(roles) ?? 'bench'}`);
};
