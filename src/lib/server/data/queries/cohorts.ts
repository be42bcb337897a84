import { cohorts, enrolments, orders, places, rosterEntries } from '../models';
import { find, select, sql, update } from '../rows';
import { acrossSchools, type Scope, type SchoolScope } from '../scope';

export type CohortLine = {
	id: string;
	title: string;
	courseTitle: string;
	courseKey: string;
	courseId: string;
	courseRevisionId: string;
	startsOn: string;
	endsOn: string;
	instructorId: string;
	instructorName: string;
	priceMinor: number;
	currency: string;
	paidPlaces: number;
	enrolled: number;
	invited: number;
	waiting: number;
};

const cohortLines = `SELECT c.id, c.title, r.title AS courseTitle, p.key AS courseKey, c.courseId,
	c.courseRevisionId, c.startsOn, c.endsOn, c.instructorId, i.name AS instructorName, c.priceMinor, c.currency,
	(SELECT count(*) FROM places x WHERE x.schoolId = c.schoolId AND x.cohortId = c.id) AS paidPlaces,
	(SELECT count(*) FROM enrolments e WHERE e.schoolId = c.schoolId AND e.cohortId = c.id) AS enrolled,
	(SELECT count(*) FROM roster_entries t WHERE t.schoolId = c.schoolId AND t.cohortId = c.id AND t.state = 'invited') AS invited,
	(SELECT count(*) FROM roster_entries t WHERE t.schoolId = c.schoolId AND t.cohortId = c.id AND t.state = 'waiting') AS waiting
	FROM cohorts c JOIN revisions r ON r.schoolId = c.schoolId AND r.id = c.courseRevisionId
	JOIN publications p ON p.schoolId = c.schoolId AND p.id = c.courseId
	JOIN people i ON i.schoolId = c.schoolId AND i.id = c.instructorId
	WHERE c.schoolId = :schoolId`;

export function listCohorts(scope: SchoolScope): Promise<CohortLine[]> {
	return sql<CohortLine>(scope, `${cohortLines} ORDER BY c.startsOn DESC, c.title`);
}

export async function findCohort(scope: SchoolScope, id: string): Promise<CohortLine | undefined> {
	return (await sql<CohortLine>(scope, `${cohortLines} AND c.id = :id`, { id }))[0];
}

export function cohortByTitle(scope: SchoolScope, title: string) {
	return find(scope, cohorts, { title });
}

export function ordersOf(scope: SchoolScope, cohortId: string) {
	return select(scope, orders, { cohortId }, { order: [['createdAt', 'desc']] });
}

export function findOrder(scope: SchoolScope, id: string) {
	return find(scope, orders, { id });
}

type OrderChange = Parameters<typeof update<typeof orders>>[3];

export function changeOrder(scope: SchoolScope, id: string, change: OrderChange) {
	return update(scope, orders, { id }, change);
}

/** Checkouts that began but of which no word has come: asked after once in a while. */
export function openOrders(scope: Scope) {
	return select(acrossSchools(scope), orders, { state: 'open' });
}

export function rosterOf(scope: SchoolScope, cohortId: string) {
	return select(
		scope,
		rosterEntries,
		{ cohortId },
		{
			order: [
				['createdAt', 'asc'],
				['id', 'asc']
			]
		}
	);
}

export function findRosterEntry(scope: SchoolScope, id: string) {
	return find(scope, rosterEntries, { id });
}

/** Paid places that nobody holds: neither an invitation nor an enrolment. */
export function freePlaces(scope: SchoolScope, cohortId: string) {
	return sql<{ id: string }>(
		scope,
		`SELECT p.id FROM places p WHERE p.schoolId = :schoolId AND p.cohortId = :cohortId
		 AND NOT EXISTS (SELECT 1 FROM roster_entries r WHERE r.schoolId = p.schoolId AND r.placeId = p.id)
		 AND NOT EXISTS (SELECT 1 FROM enrolments e WHERE e.schoolId = p.schoolId AND e.placeId = p.id)
		 ORDER BY p.openedAt, p.number, p.id`,
		{ cohortId }
	);
}

export function placesOf(scope: SchoolScope, cohortId: string) {
	return select(scope, places, { cohortId });
}

export function enrolmentsOf(scope: SchoolScope, cohortId: string) {
	return select(scope, enrolments, { cohortId });
}
