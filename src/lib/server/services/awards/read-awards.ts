import { z } from 'zod';
import type { Evidence } from '$lib/domain/certificates/evidence';
import { awardRule } from '$lib/domain/certificates/rules/registry';
import { findAward, markersOf } from '../../data/queries/awards';
import { findEnrolment } from '../../data/queries/enrolments';
import { findPerson } from '../../data/queries/schools';
import { sql } from '../../data/rows';
import { certificates } from '../../data/models';
import { find } from '../../data/rows';
import { readCase } from '../use-case';

export type AwardLine = {
	id: string;
	state: 'waiting' | 'awarded' | 'declined';
	studentName: string;
	courseTitle: string;
	cohortTitle: string;
	proposedAt: string;
	decidedAt: string | null;
	code: string | null;
	withdrawnAt: string | null;
};

/** The awards of the school: those that wait first, oldest first. */
export const listAwards = readCase({
	name: 'list-awards',
	action: 'award:list',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope }) {
		const awards = await sql<AwardLine>(
			scope,
			`SELECT a.id, a.state, p.name AS studentName, r.title AS courseTitle, c.title AS cohortTitle,
			 a.proposedAt, a.decidedAt, k.code, k.withdrawnAt
			 FROM awards a JOIN enrolments e ON e.schoolId = a.schoolId AND e.id = a.enrolmentId
			 JOIN people p ON p.schoolId = e.schoolId AND p.id = e.personId
			 JOIN cohorts c ON c.schoolId = e.schoolId AND c.id = e.cohortId
			 JOIN revisions r ON r.schoolId = c.schoolId AND r.id = c.courseRevisionId
			 LEFT JOIN certificates k ON k.schoolId = a.schoolId AND k.awardId = a.id
			 WHERE a.schoolId = :schoolId
			 ORDER BY a.state = 'waiting' DESC, CASE a.state WHEN 'waiting' THEN a.proposedAt END, a.decidedAt DESC`
		);
		return { awards };
	}
});

export const readAward = readCase({
	name: 'read-award',
	action: 'award:list',
	input: z.object({ awardId: z.string() }),
	async subject({ scope, input }) {
		const award = await findAward(scope, input.awardId);
		const enrolment = award && (await findEnrolment(scope, award.enrolmentId));
		return award && enrolment ? { schoolId: scope.schoolId, award, enrolment } : undefined;
	},
	async run({ scope, subject: { award, enrolment }, me }) {
		const [markers, decider, certificate] = await Promise.all([
			markersOf(scope, enrolment.id),
			award.decidedBy ? findPerson(scope, award.decidedBy) : undefined,
			find(scope, certificates, { awardId: award.id })
		]);
		const markerNames = await Promise.all(markers.map((id) => findPerson(scope, id)));
		return {
			id: award.id,
			state: award.state,
			rule: { name: award.rule, words: awardRule(award.rule).words },
			because: award.because,
			evidence: award.evidence as Evidence,
			proposedAt: award.proposedAt,
			decidedAt: award.decidedAt,
			decidedByName: decider?.name ?? null,
			reason: award.reason,
			studentName: enrolment.personName,
			cohortTitle: enrolment.cohortTitle,
			markerNames: markerNames.flatMap((one) => (one ? [one.name] : [])),
			/** Who marked the work, or did it, does not decide. */
			mayDecide: !markers.includes(me) && enrolment.personId !== me,
			isOwn: enrolment.personId === me,
			certificate: certificate && {
				id: certificate.id,
				code: certificate.code,
				issuedAt: certificate.issuedAt,
				withdrawnAt: certificate.withdrawnAt,
				withdrawnReason: certificate.withdrawnReason
			}
		};
	}
});
