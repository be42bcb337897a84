import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { beginSitting } from '$lib/server/services/quizzes/begin-sitting';
import { readQuizStep } from '$lib/server/services/quizzes/read-quiz';
import type { RequestEvent } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({
	enrolmentId: params.enrolment,
	stepKey: params.step
});

export const load = pageLoad(readQuizStep, (event: RequestEvent) => at(event));

export const actions = {
	begin: formAction(beginSitting, {
		extra: at,
		done: ({ sittingId }, { params }) => `/s/${params.school}/sittings/${sittingId}`
	})
};
