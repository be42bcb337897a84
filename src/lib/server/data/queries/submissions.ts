import { files, markingLeases, marks, photographs, submissions } from '../models';
import { find, select, sql } from '../rows';
import type { SchoolScope } from '../scope';

export function findSubmission(scope: SchoolScope, id: string) {
	return find(scope, submissions, { id });
}

/** All attempts at one job sheet, oldest first. */
export function attemptsOf(scope: SchoolScope, enrolmentId: string, stepKey: string) {
	return select(scope, submissions, { enrolmentId, stepKey }, { order: [['attempt', 'asc']] });
}

/** A submission's photographs that were not taken out again, in the order they came. */
export function photographsOf(scope: SchoolScope, submissionId: string) {
	return select(
		scope,
		photographs,
		{ submissionId, removedAt: null },
		{
			order: [
				['takenInAt', 'asc'],
				['id', 'asc']
			]
		}
	);
}

export function findPhotograph(scope: SchoolScope, id: string) {
	return find(scope, photographs, { id });
}

export function findFile(scope: SchoolScope, id: string) {
	return find(scope, files, { id });
}

/** The photograph that a file belongs to, and whose work it is. */
export async function ownerOfFile(scope: SchoolScope, fileId: string) {
	const [row] = await sql<{
		photographId: string;
		submissionId: string;
		ownerId: string;
		original: number;
	}>(
		scope,
		`SELECT p.id AS photographId, p.submissionId, s.personId AS ownerId, p.originalFileId = :fileId AS original
		 FROM photographs p JOIN submissions s ON s.schoolId = p.schoolId AND s.id = p.submissionId
		 WHERE p.schoolId = :schoolId
		 AND :fileId IN (p.originalFileId, p.smallFileId, p.mediumFileId, p.largeFileId) LIMIT 1`,
		{ fileId }
	);
	return row;
}

/**
 * Photographs of a submission that somebody else in the school handed in as well: the very same
 * file, or one that looks the same. Shown to the marker, never decided by the machine.
 */
export function sharedPhotographs(scope: SchoolScope, submissionId: string) {
	return sql<{ photographId: string; otherName: string; otherTitle: string; same: number }>(
		scope,
		`SELECT DISTINCT p.id AS photographId, w.name AS otherName, r.title AS otherTitle,
		 p.originalSha256 = o.originalSha256 AS same
		 FROM photographs p
		 JOIN submissions s ON s.schoolId = p.schoolId AND s.id = p.submissionId
		 JOIN photographs o ON o.schoolId = p.schoolId AND o.id <> p.id AND o.removedAt IS NULL
		  AND (o.originalSha256 = p.originalSha256 OR (o.likeness IS NOT NULL AND o.likeness = p.likeness))
		 JOIN submissions t ON t.schoolId = o.schoolId AND t.id = o.submissionId AND t.personId <> s.personId
		  AND t.state <> 'open'
		 JOIN people w ON w.schoolId = t.schoolId AND w.id = t.personId
		 JOIN revisions r ON r.schoolId = t.schoolId AND r.id = t.jobSheetRevisionId
		 WHERE p.schoolId = :schoolId AND p.submissionId = :submissionId AND p.removedAt IS NULL`,
		{ submissionId }
	);
}

export function markOf(scope: SchoolScope, submissionId: string) {
	return find(scope, marks, { submissionId });
}

export function leaseOf(scope: SchoolScope, submissionId: string) {
	return find(scope, markingLeases, { submissionId });
}

export type WaitingLine = {
	id: string;
	title: string;
	studentName: string;
	ownerId: string;
	cohortTitle: string;
	attempt: number;
	handedInAt: string;
	leaseHolderId: string | null;
	leaseHolderName: string | null;
	leaseUntilAt: string | null;
};

/** What waits to be marked, oldest first. */
export function waitingToBeMarked(scope: SchoolScope, at: string) {
	return sql<WaitingLine>(
		scope,
		`SELECT s.id, r.title, p.name AS studentName, s.personId AS ownerId, c.title AS cohortTitle, s.attempt,
		 s.handedInAt, l.markerId AS leaseHolderId, m.name AS leaseHolderName, l.untilAt AS leaseUntilAt
		 FROM submissions s
		 JOIN revisions r ON r.schoolId = s.schoolId AND r.id = s.jobSheetRevisionId
		 JOIN people p ON p.schoolId = s.schoolId AND p.id = s.personId
		 JOIN enrolments e ON e.schoolId = s.schoolId AND e.id = s.enrolmentId
		 JOIN cohorts c ON c.schoolId = e.schoolId AND c.id = e.cohortId
		 LEFT JOIN marking_leases l ON l.schoolId = s.schoolId AND l.submissionId = s.id AND l.untilAt > :at
		 LEFT JOIN people m ON m.schoolId = l.schoolId AND m.id = l.markerId
		 WHERE s.schoolId = :schoolId AND s.state = 'handed-in' ORDER BY s.handedInAt, s.id`,
		{ at }
	);
}
