import { redirect } from '@sveltejs/kit';
import type { PageServerLoad } from './$types';

/** The form asks by GET; every certificate has an address of its own. */
export const load: PageServerLoad = ({ url }) => {
	const code = url.searchParams.get('code')?.trim();
	if (code) redirect(303, `/check/${encodeURIComponent(code)}`);
	return {};
};
