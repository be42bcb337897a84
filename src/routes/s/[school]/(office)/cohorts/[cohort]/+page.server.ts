import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { buyPlaces, recordPayment } from '$lib/server/services/cohorts/buy-places';
import { inviteAgain, withdrawFromRoster } from '$lib/server/services/cohorts/change-roster';
import { applyCohortRoster, planCohortRoster } from '$lib/server/services/cohorts/plan-roster';
import { readCohort } from '$lib/server/services/cohorts/read-cohorts';
import type { RequestEvent } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({
	cohortId: params.cohort
});

export const load = pageLoad(readCohort, (event: RequestEvent) => at(event));

export const actions = {
	/** On to the till: its address is where the person pays. */
	buy: formAction(buyPlaces, { extra: at, done: ({ url }) => url }),
	record: formAction(recordPayment, { extra: at }),
	/** The dry run: nothing is written, and the list comes back with its plan. */
	plan: formAction(planCohortRoster, {
		extra: at,
		done: (plan, _, { list }) => ({ plan, list: String(list) })
	}),
	apply: formAction(applyCohortRoster, { extra: at, done: (applied) => ({ applied }) }),
	'invite-again': formAction(inviteAgain),
	'take-off': formAction(withdrawFromRoster)
};
