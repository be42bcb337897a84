import type { Course, Step } from '$lib/domain/courses/schema';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import type { Question } from '$lib/domain/questions/schema';
import { noSheet, type SheetFigures } from '$lib/domain/questions/sheet-figures';
import type { Quiz } from '$lib/domain/quizzes/schema';
import { findEnrolment, type EnrolmentLine } from '../../data/queries/enrolments';
import {
	newestRevision,
	revisionById,
	revisionsByIds,
	type Revision
} from '../../data/queries/publications';
import { questionsOfSitting } from '../../data/queries/sittings';
import type { SchoolScope } from '../../data/scope';

export type QuizStep = {
	enrolment: EnrolmentLine;
	course: Course;
	step: Step;
	quizRevision: Revision;
	quiz: Quiz;
	sheetRevision: Revision;
};

/** A quiz step of an enrolment with the newest published revisions. */
export async function quizStep(
	scope: SchoolScope,
	enrolmentId: string,
	stepKey: string
): Promise<QuizStep | undefined> {
	const enrolment = await findEnrolment(scope, enrolmentId);
	const course = enrolment && (await revisionById(scope, enrolment.courseRevisionId))?.body;
	if (!enrolment || !course) return undefined;
	const { steps, engine } = course as Course;
	const step = steps.find((one) => one.key === stepKey && one.kind === 'quiz');
	const quizRevision = step && (await newestRevision(scope, 'quiz', step.ref));
	const sheetRevision = await newestRevision(scope, 'data-sheet', engine);
	if (!step || !quizRevision || !sheetRevision) return undefined;
	const quiz = quizRevision.body as Quiz;
	return { enrolment, course: course as Course, step, quizRevision, quiz, sheetRevision };
}

export type SatQuestion = {
	id: string;
	position: number;
	seed: string;
	key: string;
	question: Question;
	figures: SheetFigures;
};

/** The questions of a sitting exactly as they were drawn: revision, seed and data sheet. */
export async function satQuestions(
	scope: SchoolScope,
	sitting: { id: string; sheetRevisionId: string }
): Promise<SatQuestion[]> {
	const rows = await questionsOfSitting(scope, sitting.id);
	const [sheet, revisions] = await Promise.all([
		revisionById(scope, sitting.sheetRevisionId),
		revisionsByIds(
			scope,
			rows.map((row) => row.questionRevisionId)
		)
	]);
	const figures = sheet ? figuresOf(dataSheetSchema.parse(sheet.body)) : noSheet;
	return rows.map((row) => {
		const revision = revisions.find((one) => one.id === row.questionRevisionId);
		if (!revision) throw new Error('a sitting names its questions');
		const question = revision.body as Question;
		return {
			id: row.id,
			position: row.position,
			seed: row.seed,
			key: revision.key,
			question,
			figures: question.sheet ? figures : noSheet
		};
	});
}
