import { redirect } from '@sveltejs/kit';
import type { RequestHandler } from './$types';

/** The way in after a sign-in: to the first school, to the account of who is in none, or to sign in. */
export const GET: RequestHandler = async ({ locals }) => {
	const actor = await locals.actor();
	if (actor.kind !== 'account') redirect(303, '/sign-in');
	const [first] = actor.memberships;
	redirect(303, first ? `/s/${first.schoolSlug}` : '/account');
};
