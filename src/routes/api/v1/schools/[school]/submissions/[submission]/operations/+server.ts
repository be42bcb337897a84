import { jsonWrite } from '$lib/server/http/json';
import { workOnSubmission } from '$lib/server/services/submissions/work-on-submission';
import type { RequestEvent } from './$types';

export const POST = jsonWrite(workOnSubmission, ({ params }: RequestEvent) => ({
	submissionId: params.submission
}));
