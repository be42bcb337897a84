import { z } from 'zod';
import { awardRule } from '$lib/domain/certificates/rules/registry';
import { awardsOf, markersOf } from '../../data/queries/awards';
import { findEnrolment, type EnrolmentLine } from '../../data/queries/enrolments';
import { gatherEvidence } from '../../data/queries/evidence';
import { peopleWithRole, schoolById } from '../../data/queries/schools';
import { accounts, awards, enrolments } from '../../data/models';
import { find, insert } from '../../data/rows';
import { acrossSchools, within, type SchoolScope } from '../../data/scope';
import type { House } from '../house';
import { writeCase, type Written } from '../use-case';

/**
 * Looks whether the award rule is met and, when it is, puts the award to a verifier. Asked after
 * every change that can complete a course; asked twice it proposes once.
 */
export const proposeAward = writeCase({
	name: 'propose-award',
	action: 'system:run',
	where: 'common',
	input: z.object({ enrolmentId: z.string() }),
	async subject({ scope, input }) {
		const row = await find(acrossSchools(scope), enrolments, { id: input.enrolmentId });
		return row && { row };
	},
	async run({ scope: everywhere, house, subject: { row }, at, newId, record, mail }) {
		const scope = within(everywhere, row.schoolId);
		const enrolment = await findEnrolment(scope, row.id);
		if (!enrolment) return { proposed: false };
		const standing = await awardsOf(scope, enrolment.id);
		if (standing.some((one) => one.state !== 'declined')) return { proposed: false };
		const { course, evidence } = await gatherEvidence(scope, enrolment);
		const verdict = awardRule(course.award.rule).decide(evidence);
		if (!verdict.met) return { proposed: false, missing: verdict.missing };
		const id = newId();
		await insert(scope, awards, {
			id,
			enrolmentId: enrolment.id,
			state: 'waiting',
			rule: course.award.rule,
			evidence,
			because: verdict.because,
			proposedAt: at.toISOString(),
			decidedBy: null,
			decidedAt: null,
			reason: null
		});
		const { schoolId } = scope;
		const data = { enrolment: enrolment.id, rule: course.award.rule };
		await record({ schoolId, kind: 'award-proposed', subject: id, data });
		await tellVerifiers({ scope, house, mail }, enrolment, course.title);
		return { proposed: true };
	}
});

type Teller = { scope: SchoolScope; house: House; mail: Written['mail'] };

/** Those who may decide: verifiers who neither did nor marked the work. */
async function tellVerifiers(
	{ scope, house, mail }: Teller,
	enrolment: EnrolmentLine,
	courseTitle: string
) {
	const [verifiers, markers, school] = await Promise.all([
		peopleWithRole(scope, 'verifier'),
		markersOf(scope, enrolment.id),
		schoolById(scope, scope.schoolId)
	]);
	const free = verifiers.filter(
		(one) => !markers.includes(one.id) && one.id !== enrolment.personId
	);
	for (const { accountId, name } of free) {
		const account = await find(acrossSchools(scope), accounts, { id: accountId });
		if (!account) continue;
		const address = `${house.config.ORIGIN}/s/${school?.slug}/awards`;
		const payload = { name, courseTitle, address };
		await mail({ kind: 'award-waiting', to: account.email, payload, schoolId: scope.schoolId });
	}
}
