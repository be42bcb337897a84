import type { Course } from '$lib/domain/courses/schema';
import type { StepState } from '$lib/domain/courses/step-state';
import { enrolments, stepStates } from '../models';
import { find, insert, insertAll, select, sql, update } from '../rows';
import type { SchoolScope } from '../scope';
import { revisionById } from './publications';

export type EnrolmentLine = {
	id: string;
	personId: string;
	personName: string;
	cohortId: string;
	cohortTitle: string;
	courseId: string;
	courseKey: string;
	courseRevisionId: string;
	startsOn: string;
	endsOn: string;
	enrolledAt: string;
};

const lines = `SELECT e.id, e.personId, s.name AS personName, e.cohortId, c.title AS cohortTitle, c.courseId,
	p.key AS courseKey, c.courseRevisionId, c.startsOn, c.endsOn, e.enrolledAt
	FROM enrolments e JOIN cohorts c ON c.schoolId = e.schoolId AND c.id = e.cohortId
	JOIN people s ON s.schoolId = e.schoolId AND s.id = e.personId
	JOIN publications p ON p.schoolId = c.schoolId AND p.id = c.courseId
	WHERE e.schoolId = :schoolId`;

export async function findEnrolment(scope: SchoolScope, id: string) {
	return (await sql<EnrolmentLine>(scope, `${lines} AND e.id = :id`, { id }))[0];
}

export function enrolmentsOfPerson(scope: SchoolScope, personId: string) {
	return sql<EnrolmentLine>(
		scope,
		`${lines} AND e.personId = :personId ORDER BY e.enrolledAt DESC`,
		{
			personId
		}
	);
}

export function enrolmentsOfCohort(scope: SchoolScope, cohortId: string) {
	return sql<EnrolmentLine>(scope, `${lines} AND e.cohortId = :cohortId ORDER BY s.name`, {
		cohortId
	});
}

/** Takes somebody in, with one step state a step, so that chart and bench read one table. */
export async function enrol(
	scope: SchoolScope,
	row: {
		id: string;
		cohortId: string;
		courseRevisionId: string;
		personId: string;
		placeId: string;
		rosterEntryId: string | null;
		enrolledAt: string;
	}
): Promise<void> {
	const { courseRevisionId, ...enrolment } = row;
	await insert(scope, enrolments, enrolment);
	const course = await revisionById(scope, courseRevisionId);
	await insertAll(
		scope,
		stepStates,
		(course?.body as Course).steps.map((step) => ({
			enrolmentId: row.id,
			stepKey: step.key,
			state: 'not-begun' as const,
			note: null,
			score: null,
			updatedAt: row.enrolledAt
		}))
	);
}

export function stepStatesOf(scope: SchoolScope, enrolmentId: string) {
	return select(scope, stepStates, { enrolmentId });
}

export function stepState(scope: SchoolScope, enrolmentId: string, stepKey: string) {
	return find(scope, stepStates, { enrolmentId, stepKey });
}

/** Every step state of a cohort in one query: what the progress chart is drawn from. */
export function stepStatesOfCohort(scope: SchoolScope, cohortId: string) {
	return sql<{
		enrolmentId: string;
		stepKey: string;
		state: StepState;
		note: string | null;
		score: number | null;
	}>(
		scope,
		`SELECT t.enrolmentId, t.stepKey, t.state, t.note, t.score FROM step_states t
		 JOIN enrolments e ON e.schoolId = t.schoolId AND e.id = t.enrolmentId
		 WHERE t.schoolId = :schoolId AND e.cohortId = :cohortId`,
		{ cohortId }
	);
}

export async function setStepState(
	scope: SchoolScope,
	where: { enrolmentId: string; stepKey: string },
	change: { state: StepState; note?: string | null; score?: number | null; updatedAt: string }
): Promise<void> {
	await update(scope, stepStates, where, change);
}
