import { error } from '@sveltejs/kit';
import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { handInSubmission } from '$lib/server/services/submissions/hand-in-submission';
import { readSubmission } from '$lib/server/services/submissions/read-submission';
import type { PageServerLoad, RequestEvent } from './$types';

const read = pageLoad(readSubmission, ({ params }: RequestEvent) => ({
	submissionId: params.submission
}));

export const load: PageServerLoad = async (event) => {
	const attempt = await read(event);
	const { enrolment, step } = event.params;
	if (attempt.enrolmentId !== enrolment || attempt.stepKey !== step)
		error(404, { message: 'There is no attempt at this address.' });
	return attempt;
};

export const actions = {
	'hand-in': formAction(handInSubmission, {
		extra: ({ params }) => ({ submissionId: params.submission })
	})
};
