import type { Course } from '$lib/domain/courses/schema';
import type { JobSheet } from '$lib/domain/job-sheets/schema';
import type { Question } from '$lib/domain/questions/schema';
import { sql } from '../rows';
import type { SchoolScope } from '../scope';
import { newestRevisions } from './publications';

/** What of a lesson's published body this asks for. */
type LessonBody = { title: string; sheetKeys?: string[] };

/** What the school teaches from one data sheet, as published now. */
export async function taughtFrom(scope: SchoolScope, sheetKey: string) {
	const [courses, questions, jobSheets] = await Promise.all([
		newestRevisions(scope, 'course'),
		newestRevisions(scope, 'question'),
		newestRevisions(scope, 'job-sheet')
	]);
	const lessonKeys = courses
		.map((one) => one.body as Course)
		.filter((one) => one.engine === sheetKey)
		.flatMap((one) => one.steps.filter((step) => step.kind === 'lesson').map((step) => step.ref));
	const lessons = await newestRevisions(scope, 'lesson', [...new Set(lessonKeys)]);
	return {
		lessons: lessons.map(({ key, body }) => {
			const { title, sheetKeys = [] } = body as LessonBody;
			return { key, title, sheetKeys };
		}),
		questions: questions.map((one) => one.body as Question).filter((one) => one.sheet === sheetKey),
		jobSheets: jobSheets.map((one) => one.body as JobSheet).filter((one) => one.engine === sheetKey)
	};
}

export type OpenSittingLine = {
	id: string;
	studentName: string;
	title: string;
	startedAt: string;
	sheetNumber: number;
};

/** Sittings that are open now and were drawn from any revision of the sheet. */
export function openSittingsFrom(scope: SchoolScope, sheetKey: string) {
	return sql<OpenSittingLine>(
		scope,
		`SELECT s.id, p.name AS studentName, q.title, s.startedAt, r.number AS sheetNumber
		 FROM sittings s
		 JOIN people p ON p.schoolId = s.schoolId AND p.id = s.personId
		 JOIN revisions q ON q.schoolId = s.schoolId AND q.id = s.quizRevisionId
		 JOIN revisions r ON r.schoolId = s.schoolId AND r.id = s.sheetRevisionId
		 JOIN publications d ON d.schoolId = r.schoolId AND d.id = r.publicationId
		 WHERE s.schoolId = :schoolId AND s.state = 'open' AND d.kind = 'data-sheet' AND d.key = :sheetKey
		 ORDER BY p.name, s.id`,
		{ sheetKey }
	);
}

/** The questions as they were drawn in these sittings. */
export async function questionsDrawnIn(scope: SchoolScope, sittingIds: readonly string[]) {
	if (sittingIds.length === 0) return [];
	const rows = await sql<{ sittingId: string; body: string }>(
		scope,
		`SELECT q.sittingId, r.body FROM sitting_questions q
		 JOIN revisions r ON r.schoolId = q.schoolId AND r.id = q.questionRevisionId
		 WHERE q.schoolId = :schoolId AND q.sittingId IN (:sittingIds)`,
		{ sittingIds }
	);
	return rows.map(({ sittingId, body }) => ({
		sittingId,
		question: JSON.parse(body) as Question
	}));
}

/** Attempts that are not decided yet and were opened on any revision of the sheet. */
export async function openAttemptsOn(scope: SchoolScope, sheetKey: string) {
	const rows = await sql<{
		id: string;
		studentName: string;
		body: string;
		openedAt: string;
		state: string;
		sheetNumber: number;
	}>(
		scope,
		`SELECT s.id, p.name AS studentName, j.body, s.openedAt, s.state, r.number AS sheetNumber
		 FROM submissions s
		 JOIN people p ON p.schoolId = s.schoolId AND p.id = s.personId
		 JOIN revisions j ON j.schoolId = s.schoolId AND j.id = s.jobSheetRevisionId
		 JOIN revisions r ON r.schoolId = s.schoolId AND r.id = s.sheetRevisionId
		 JOIN publications d ON d.schoolId = r.schoolId AND d.id = r.publicationId
		 WHERE s.schoolId = :schoolId AND s.state IN ('open', 'handed-in')
		  AND d.kind = 'data-sheet' AND d.key = :sheetKey
		 ORDER BY p.name, s.id`,
		{ sheetKey }
	);
	return rows.map(({ body, ...row }) => ({ ...row, jobSheet: JSON.parse(body) as JobSheet }));
}
