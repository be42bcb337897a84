import type { Course, Step } from '$lib/domain/courses/schema';
import { dataSheetSchema, type DataSheet } from '$lib/domain/data-sheets/schema';
import type { JobSheet } from '$lib/domain/job-sheets/schema';
import { findEnrolment, type EnrolmentLine } from './enrolments';
import { newestRevision, revisionById, type Revision } from './publications';
import type { SchoolScope } from '../scope';

export type JobSheetContext = {
	enrolment: EnrolmentLine;
	course: Course;
	step: Step;
	jobSheetRevision: Revision;
	jobSheet: JobSheet;
	sheetRevision: Revision;
	sheet: DataSheet;
};

/** One enrolment's job-sheet step with the newest published revisions: what a new attempt stands on. */
export async function jobSheetStep(
	scope: SchoolScope,
	enrolmentId: string,
	stepKey: string
): Promise<JobSheetContext | undefined> {
	const enrolment = await findEnrolment(scope, enrolmentId);
	if (!enrolment) return undefined;
	const course = (await revisionById(scope, enrolment.courseRevisionId))?.body as Course;
	const step = course.steps.find((one) => one.key === stepKey && one.kind === 'job-sheet');
	const jobSheetRevision = step && (await newestRevision(scope, 'job-sheet', step.ref));
	if (!step || !jobSheetRevision) return undefined;
	const jobSheet = jobSheetRevision.body as JobSheet;
	const sheetRevision = await newestRevision(scope, 'data-sheet', jobSheet.engine);
	if (!sheetRevision) return undefined;
	const sheet = dataSheetSchema.parse(sheetRevision.body);
	return { enrolment, course, step, jobSheetRevision, jobSheet, sheetRevision, sheet };
}

/** The revisions that an attempt was opened against: they never move under it. */
export async function revisionsOfAttempt(
	scope: SchoolScope,
	attempt: { jobSheetRevisionId: string; sheetRevisionId: string }
) {
	const [jobSheetRevision, sheetRevision] = await Promise.all([
		revisionById(scope, attempt.jobSheetRevisionId),
		revisionById(scope, attempt.sheetRevisionId)
	]);
	if (!jobSheetRevision || !sheetRevision) throw new Error('an attempt names its revisions');
	return {
		jobSheet: jobSheetRevision.body as JobSheet,
		jobSheetNumber: jobSheetRevision.number,
		sheet: dataSheetSchema.parse(sheetRevision.body)
	};
}
