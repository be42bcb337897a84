import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { openSubmission } from '$lib/server/services/submissions/open-submission';
import { readJobSheetStep } from '$lib/server/services/submissions/read-submission';
import type { RequestEvent } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({
	enrolmentId: params.enrolment,
	stepKey: params.step
});

export const load = pageLoad(readJobSheetStep, (event: RequestEvent) => at(event));

export const actions = {
	open: formAction(openSubmission, {
		extra: at,
		done: ({ submissionId }, { url }) => `${url.pathname}/${submissionId}`
	})
};
