import { z } from 'zod';
import type { Evidence } from '$lib/domain/certificates/evidence';
import { certificateCode } from '$lib/domain/certificates/code';
import { checkAddress, faceOf } from '$lib/domain/certificates/face';
import { awardRule } from '$lib/domain/certificates/rules/registry';
import { inputProblem, Problem } from '$lib/domain/problem';
import { findAward, markersOf } from '../../data/queries/awards';
import { findEnrolment, type EnrolmentLine } from '../../data/queries/enrolments';
import { gatherEvidence } from '../../data/queries/evidence';
import { revisionById } from '../../data/queries/publications';
import { findPerson, schoolById } from '../../data/queries/schools';
import { accounts, awards, certificates } from '../../data/models';
import { find, insert, update } from '../../data/rows';
import { acrossSchools, type SchoolScope } from '../../data/scope';
import { writeCase, type Written } from '../use-case';

/**
 * A verifier's decision. The evidence is gathered again and the rule asked again in this
 * transaction: what was true when the award was proposed may not be any more.
 */
export const decideAward = writeCase({
	name: 'decide-award',
	action: 'award:decide',
	input: z.object({
		awardId: z.string(),
		decision: z.enum(['award', 'decline'], 'Choose to award or to decline.'),
		reason: z.string().trim().max(1000).default('')
	}),
	async subject({ scope, input }) {
		const award = await findAward(scope, input.awardId);
		const enrolment = award && (await findEnrolment(scope, award.enrolmentId));
		if (!award || !enrolment) return undefined;
		const markerIds = await markersOf(scope, enrolment.id);
		return { schoolId: scope.schoolId, ownerId: enrolment.personId, markerIds, award, enrolment };
	},
	async run({ scope, house, subject, input, me, at, newId, record, mail }) {
		const { award, enrolment } = subject;
		if (award.state !== 'waiting') throw new Problem('conflict', 'This award is decided already.');
		if (input.decision === 'decline' && input.reason === '')
			throw inputProblem({ reason: ['Say why: the student reads it.'] });
		const decidedAt = at.toISOString();
		const decided = { decidedBy: me, decidedAt, reason: input.reason || null };
		const tell = await teller(scope, enrolment, mail);
		if (input.decision === 'decline') {
			await update(
				scope,
				awards,
				{ id: award.id, state: 'waiting' },
				{ state: 'declined', ...decided }
			);
			await record({ kind: 'award-declined', subject: award.id, data: { reason: input.reason } });
			const revision = await revisionById(scope, enrolment.courseRevisionId);
			const home = await schoolById(scope, scope.schoolId);
			await tell('award-decided', {
				courseTitle: revision?.title ?? '',
				decision: 'declined',
				reason: input.reason,
				address: `${house.config.ORIGIN}/s/${home?.slug}/bench`
			});
			return { state: 'declined' as const, certificateId: null };
		}
		const { evidence, course, courseRevision } = await gatherEvidence(scope, enrolment);
		const rule = awardRule(award.rule);
		const verdict = rule.decide(evidence);
		if (!verdict.met)
			throw new Problem('conflict', 'The rule is not met any more: {missing}', {
				missing: verdict.missing.join(' ')
			});
		const [school, decider] = await Promise.all([
			schoolById(scope, scope.schoolId),
			findPerson(scope, me)
		]);
		const code = certificateCode(house.chance(7));
		const face = faceOf(
			{
				code,
				personName: enrolment.personName,
				school: { name: school?.name ?? '', place: school?.town ?? null },
				course: { title: course.title, revision: courseRevision },
				awardedOn: decidedAt.slice(0, 10),
				decidedBy: { name: decider?.name ?? '', schoolName: school?.name ?? '' }
			},
			evidence,
			rule,
			verdict
		);
		await update(
			scope,
			awards,
			{ id: award.id, state: 'waiting' },
			{
				state: 'awarded',
				evidence: evidence satisfies Evidence,
				because: verdict.because,
				...decided
			}
		);
		const certificateId = newId();
		await insert(scope, certificates, {
			id: certificateId,
			awardId: award.id,
			personId: enrolment.personId,
			code,
			face,
			issuedAt: decidedAt,
			withdrawnAt: null,
			withdrawnBy: null,
			withdrawnReason: null
		});
		await record({ kind: 'award-given', subject: award.id, data: { certificate: certificateId } });
		await tell('certificate-ready', {
			courseTitle: course.title,
			code,
			address: `${house.config.ORIGIN}/s/${school?.slug}/certificates`,
			checkAddress: checkAddress(house.config.ORIGIN, code)
		});
		return { state: 'awarded' as const, certificateId };
	}
});

async function teller(scope: SchoolScope, enrolment: EnrolmentLine, mail: Written['mail']) {
	const person = await findPerson(scope, enrolment.personId);
	const account = person && (await find(acrossSchools(scope), accounts, { id: person.accountId }));
	return async (kind: string, payload: Record<string, unknown>) => {
		if (account)
			await mail({ kind, to: account.email, payload: { name: enrolment.personName, ...payload } });
	};
}
