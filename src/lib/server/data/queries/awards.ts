import { awards, certificates } from '../models';
import { find, select, sql } from '../rows';
import { acrossSchools, type Scope, type SchoolScope } from '../scope';

export function awardsOf(scope: SchoolScope, enrolmentId: string) {
	return select(scope, awards, { enrolmentId }, { order: [['proposedAt', 'desc']] });
}

export function certificatesOf(scope: SchoolScope, enrolmentId: string) {
	return sql<{ id: string; code: string; issuedAt: string; withdrawnAt: string | null }>(
		scope,
		`SELECT c.id, c.code, c.issuedAt, c.withdrawnAt FROM certificates c
		 JOIN awards a ON a.schoolId = c.schoolId AND a.id = c.awardId
		 WHERE c.schoolId = :schoolId AND a.enrolmentId = :enrolmentId ORDER BY c.issuedAt DESC`,
		{ enrolmentId }
	);
}

export function findAward(scope: SchoolScope, id: string) {
	return find(scope, awards, { id });
}

export function findCertificate(scope: SchoolScope, id: string) {
	return find(scope, certificates, { id });
}

/** By its short code, whichever school issued it: anyone may check. */
export function certificateByCode(scope: Scope, code: string) {
	return find(acrossSchools(scope), certificates, { code });
}

/** Everybody who marked any of an enrolment's work: they do not decide its award. */
export async function markersOf(scope: SchoolScope, enrolmentId: string): Promise<string[]> {
	const rows = await sql<{ markerId: string }>(
		scope,
		`SELECT DISTINCT m.markerId FROM marks m
		 JOIN submissions s ON s.schoolId = m.schoolId AND s.id = m.submissionId
		 WHERE m.schoolId = :schoolId AND s.enrolmentId = :enrolmentId`,
		{ enrolmentId }
	);
	return rows.map((row) => row.markerId);
}
