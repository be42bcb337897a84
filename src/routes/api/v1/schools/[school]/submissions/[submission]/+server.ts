import { jsonRead } from '$lib/server/http/json';
import { readSubmission } from '$lib/server/services/submissions/read-submission';
import type { RequestEvent } from './$types';

export const GET = jsonRead(readSubmission, ({ params }: RequestEvent) => ({
	submissionId: params.submission
}));
