import { pageLoad } from '$lib/server/http/page';
import { readProgress } from '$lib/server/services/progress/read-progress';
import type { RequestEvent } from './$types';

export const load = pageLoad(readProgress, ({ params }: RequestEvent) => ({
	cohortId: params.cohort
}));
