import type { Course, Step } from '$lib/domain/courses/schema';
import { findEnrolment, type EnrolmentLine } from '../../data/queries/enrolments';
import { newestRevision, revisionById, type Revision } from '../../data/queries/publications';
import type { SchoolScope } from '../../data/scope';

/** What a lesson's revision keeps: which film, how long, and the text as it was rendered then. */
export type LessonBody = {
	key: string;
	title: string;
	drawnBy: string;
	filmHash: string | null;
	filmSeconds: number | null;
	sheetKeys: string[];
	html: string;
};

export type LessonStep = {
	enrolment: EnrolmentLine;
	course: Course;
	step: Step;
	revision: Revision;
	body: LessonBody;
};

export async function lessonStep(
	scope: SchoolScope,
	enrolmentId: string,
	stepKey: string
): Promise<LessonStep | undefined> {
	const enrolment = await findEnrolment(scope, enrolmentId);
	const course = enrolment && (await revisionById(scope, enrolment.courseRevisionId))?.body;
	if (!enrolment || !course) return undefined;
	const step = (course as Course).steps.find((one) => one.key === stepKey && one.kind === 'lesson');
	const revision = step && (await newestRevision(scope, 'lesson', step.ref));
	if (!step || !revision) return undefined;
	return { enrolment, course: course as Course, step, revision, body: revision.body as LessonBody };
}
