import { jsonWrite } from '$lib/server/http/json';
import { planCohortRoster } from '$lib/server/services/cohorts/plan-roster';
import type { RequestEvent } from './$types';

export const POST = jsonWrite(planCohortRoster, ({ params }: RequestEvent) => ({
	cohortId: params.cohort
}));
