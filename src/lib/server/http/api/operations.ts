import type { z } from 'zod';
import { readCohorts } from '../../services/cohorts/read-cohorts';
import { applyCohortRoster, planCohortRoster } from '../../services/cohorts/plan-roster';
import { workOnSheetDraft } from '../../services/courses/work-on-sheet-draft';
import { watchFilm } from '../../services/learning/watch-film';
import { listWaiting } from '../../services/marking/list-waiting';
import { readProgress } from '../../services/progress/read-progress';
import { openOnDevice } from '../../services/quizzes/open-on-device';
import { saveResponse } from '../../services/quizzes/save-response';
import { removePhotograph } from '../../services/submissions/add-photograph';
import { readSubmission } from '../../services/submissions/read-submission';
import { workOnSubmission } from '../../services/submissions/work-on-submission';

export type ApiOperation = {
	method: 'get' | 'post' | 'delete';
	path: string;
	summary: string;
	useCase: { name: string; writes: boolean; input: z.ZodType; action: string };
	/** Fields of the input that the address says. */
	inPath: Record<string, string>;
	/** The scope that a school's script needs; null where only the product's own pages call it. */
	scope: string | null;
};

const school = '/api/v1/schools/{school}';
const attempt = { submission: 'submissionId' };
const sitting = { sitting: 'sittingId' };
const cohort = { cohort: 'cohortId' };

/** What `/api/v1` does. The description that it gives of itself is made from this and the schemas. */
export const apiOperations: readonly ApiOperation[] = [
	{
		method: 'get',
		path: `${school}/cohorts`,
		summary: 'Cohorts with their places',
		useCase: readCohorts,
		inPath: {},
		scope: 'cohorts'
	},
	{
		method: 'get',
		path: `${school}/cohorts/{cohort}/progress`,
		summary: 'A cohort’s progress chart',
		useCase: readProgress,
		inPath: cohort,
		scope: 'progress'
	},
	{
		method: 'post',
		path: `${school}/cohorts/{cohort}/roster/plan`,
		summary: 'Dry run of a roster',
		useCase: planCohortRoster,
		inPath: cohort,
		scope: 'roster'
	},
	{
		method: 'post',
		path: `${school}/cohorts/{cohort}/roster`,
		summary: 'Write a roster and invite',
		useCase: applyCohortRoster,
		inPath: cohort,
		scope: 'roster'
	},
	{
		method: 'get',
		path: `${school}/marking`,
		summary: 'What waits to be marked',
		useCase: listWaiting,
		inPath: {},
		scope: null
	},
	{
		method: 'get',
		path: `${school}/submissions/{submission}`,
		summary: 'A submission',
		useCase: readSubmission,
		inPath: attempt,
		scope: null
	},
	{
		method: 'post',
		path: `${school}/submissions/{submission}/operations`,
		summary: 'Change an open submission',
		useCase: workOnSubmission,
		inPath: attempt,
		scope: null
	},
	{
		method: 'delete',
		path: `${school}/submissions/{submission}/photographs/{photograph}`,
		summary: 'Take a photograph out',
		useCase: removePhotograph,
		inPath: { ...attempt, photograph: 'photographId' },
		scope: null
	},
	{
		method: 'post',
		path: `${school}/sittings/{sitting}/open`,
		summary: 'Open a sitting on this device',
		useCase: openOnDevice,
		inPath: sitting,
		scope: null
	},
	{
		method: 'post',
		path: `${school}/sittings/{sitting}/responses`,
		summary: 'Save a response',
		useCase: saveResponse,
		inPath: sitting,
		scope: null
	},
	{
		method: 'post',
		path: `${school}/enrolments/{enrolment}/steps/{step}/watched`,
		summary: 'Report watched stretches of a film',
		useCase: watchFilm,
		inPath: { enrolment: 'enrolmentId', step: 'stepKey' },
		scope: null
	},
	{
		method: 'post',
		path: `${school}/data-sheets/{sheet}/draft/operations`,
		summary: 'Change the draft of a data sheet',
		useCase: workOnSheetDraft,
		inPath: { sheet: 'key' },
		scope: null
	}
];
