import { responses, sittingFacts, sittingQuestions, sittings } from '../models';
import { find, insert, select, sql, update } from '../rows';
import { acrossSchools, type Scope, type SchoolScope } from '../scope';

export function findSitting(scope: SchoolScope, id: string) {
	return find(scope, sittings, { id });
}

export function sittingsOf(scope: SchoolScope, enrolmentId: string, stepKey: string) {
	return select(scope, sittings, { enrolmentId, stepKey }, { order: [['number', 'asc']] });
}

export function openSittingOf(scope: SchoolScope, personId: string) {
	return find(scope, sittings, { personId, state: 'open' });
}

/** Open sittings whose time is over, in every school: the worker ends them. */
export function overdueSittings(scope: Scope, before: string) {
	return select(acrossSchools(scope), sittings, { state: 'open', deadlineAt: { below: before } });
}

export function questionsOfSitting(scope: SchoolScope, sittingId: string) {
	return select(scope, sittingQuestions, { sittingId }, { order: [['position', 'asc']] });
}

export function responsesOfSitting(scope: SchoolScope, questionIds: readonly string[]) {
	if (questionIds.length === 0) return Promise.resolve([]);
	return select(scope, responses, { sittingQuestionId: questionIds });
}

type ResponseRow = {
	sittingQuestionId: string;
	epoch: number;
	number: number;
	body: unknown;
	receivedAt: string;
};

/** One row a question: the newest response stands, by (epoch, number) and never by a clock. */
export async function keepResponse(scope: SchoolScope, row: ResponseRow, isFirst: boolean) {
	const { sittingQuestionId, ...change } = row;
	if (isFirst) await insert(scope, responses, { ...row, points: null, working: null });
	else await update(scope, responses, { sittingQuestionId }, change);
}

export async function noteFact(
	scope: SchoolScope,
	fact: { id: string; sittingId: string; kind: string; detail: unknown; at: string }
) {
	await insert(scope, sittingFacts, fact);
}

export function factsOf(scope: SchoolScope, sittingId: string) {
	return select(scope, sittingFacts, { sittingId }, { order: [['at', 'asc']] });
}

/** Keys of the questions that a person has had before in this quiz: new ones are drawn first. */
export async function questionsHadBefore(scope: SchoolScope, personId: string, quizId: string) {
	const rows = await sql<{ key: string }>(
		scope,
		`SELECT DISTINCT p.key FROM sitting_questions q
		 JOIN sittings s ON s.schoolId = q.schoolId AND s.id = q.sittingId
		 JOIN revisions r ON r.schoolId = q.schoolId AND r.id = q.questionRevisionId
		 JOIN publications p ON p.schoolId = r.schoolId AND p.id = r.publicationId
		 WHERE q.schoolId = :schoolId AND s.personId = :personId AND s.quizId = :quizId`,
		{ personId, quizId }
	);
	return rows.map((row) => row.key);
}
