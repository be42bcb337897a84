import { jsonWrite } from '$lib/server/http/json';
import { applyCohortRoster } from '$lib/server/services/cohorts/plan-roster';
import type { RequestEvent } from './$types';

export const POST = jsonWrite(applyCohortRoster, ({ params }: RequestEvent) => ({
	cohortId: params.cohort
}));
