import { firstPage, railOf } from '$lib/domain/accounts/rail';
import { membershipIn } from '$lib/domain/actor';
import { isLoopback } from '$lib/server/config/env';
import type { LayoutServerLoad } from './$types';

/** What stands around every page: who is here, where they can go, and whether this is a demo. */
export const load: LayoutServerLoad = async ({ locals, params }) => {
	const { config } = locals.house;
	const actor = await locals.actor();
	const memberships = actor.kind === 'account' ? actor.memberships : [];
	const here = params.school === undefined ? undefined : locals.school;
	const membership = here ? membershipIn(actor, here.id) : memberships[0];
	const prefix = membership && `/s/${membership.schoolSlug}`;
	return {
		demo: config.DEMO === 'on' ? { mailbox: config.MAILBOX_URL ?? null } : null,
		showDemoPassword: config.DEMO === 'on' && isLoopback(config.ORIGIN),
		who: actor.kind === 'account' ? { name: actor.name, email: actor.email } : null,
		school: membership ? { name: membership.schoolName, slug: membership.schoolSlug } : null,
		schools: memberships.map((one) => ({ name: one.schoolName, slug: one.schoolSlug })),
		home: membership ? `${prefix}/${firstPage(membership.roles) ?? ''}` : '/',
		rail: membership
			? railOf(membership.roles).map(({ path, words }) => ({ href: `${prefix}/${path}`, words }))
			: []
	};
};
