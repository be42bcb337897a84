import { formAction } from '$lib/server/http/form';
import { load as loadPage } from '$lib/server/http/page';
import { createCohort } from '$lib/server/services/cohorts/create-cohort';
import { readCohortChoices, readCohorts } from '$lib/server/services/cohorts/read-cohorts';
import { readCourseChoices, takeCourse } from '$lib/server/services/courses/take-course';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	const [{ cohorts }, choices, { courses }] = await Promise.all([
		loadPage(event, readCohorts),
		loadPage(event, readCohortChoices),
		loadPage(event, readCourseChoices)
	]);
	return { cohorts, choices, catalogue: courses };
};

export const actions = {
	create: formAction(createCohort, {
		done: ({ cohortId }, { params }) => `/s/${params.school}/cohorts/${cohortId}`
	}),
	take: formAction(takeCourse, { extra: ({ locals }) => ({ schoolId: locals.school?.id }) })
};
