import { pageLoad } from '$lib/server/http/page';
import { readSittingResult } from '$lib/server/services/quizzes/read-quiz';
import type { RequestEvent } from './$types';

export const load = pageLoad(readSittingResult, ({ params }: RequestEvent) => ({
	sittingId: params.sitting
}));
