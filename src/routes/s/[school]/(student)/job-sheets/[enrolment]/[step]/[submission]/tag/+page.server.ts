import { pageLoad } from '$lib/server/http/page';
import { readSubmission } from '$lib/server/services/submissions/read-submission';
import type { RequestEvent } from './$types';

export const load = pageLoad(readSubmission, ({ params }: RequestEvent) => ({
	submissionId: params.submission
}));
