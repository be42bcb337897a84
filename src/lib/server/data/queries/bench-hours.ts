import { benchHours } from '../models';
import { select, sql } from '../rows';
import type { SchoolScope } from '../scope';

export async function minutesOf(scope: SchoolScope, enrolmentId: string): Promise<number> {
	const [row] = await sql<{ minutes: number | null }>(
		scope,
		'SELECT sum(minutes) AS minutes FROM bench_hours WHERE schoolId = :schoolId AND enrolmentId = :enrolmentId',
		{ enrolmentId }
	);
	return row?.minutes ?? 0;
}

export function benchHoursOf(scope: SchoolScope, enrolmentId: string) {
	return select(scope, benchHours, { enrolmentId }, { order: [['onDay', 'desc']] });
}

/** Minutes by enrolment for a whole cohort, in one query. */
export function minutesOfCohort(scope: SchoolScope, cohortId: string) {
	return sql<{ enrolmentId: string; minutes: number }>(
		scope,
		`SELECT b.enrolmentId, sum(b.minutes) AS minutes FROM bench_hours b
		 JOIN enrolments e ON e.schoolId = b.schoolId AND e.id = b.enrolmentId
		 WHERE b.schoolId = :schoolId AND e.cohortId = :cohortId GROUP BY b.enrolmentId`,
		{ cohortId }
	);
}
