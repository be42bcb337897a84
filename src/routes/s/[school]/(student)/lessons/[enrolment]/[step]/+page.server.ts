import { formAction } from '$lib/server/http/form';
import { load as loadPage } from '$lib/server/http/page';
import { readLesson } from '$lib/server/services/learning/read-lesson';
import { finishLesson } from '$lib/server/services/learning/watch-film';
import type { PageServerLoad } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({
	enrolmentId: params.enrolment,
	stepKey: params.step
});

export const load: PageServerLoad = (event) => loadPage(event, readLesson, at(event));

export const actions = {
	finish: formAction(finishLesson, {
		extra: at,
		done: (_, { params }) => `/s/${params.school}/bench`
	})
};
