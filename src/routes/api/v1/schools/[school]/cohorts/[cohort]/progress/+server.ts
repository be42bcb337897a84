import { jsonRead } from '$lib/server/http/json';
import { readProgress } from '$lib/server/services/progress/read-progress';
import type { RequestEvent } from './$types';

export const GET = jsonRead(readProgress, ({ params }: RequestEvent) => ({
	cohortId: params.cohort
}));
