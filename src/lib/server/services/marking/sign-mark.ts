import { z } from 'zod';
import { decide, markFaults } from '$lib/domain/marking/decide';
import { holderNow } from '$lib/domain/marking/lease';
import { markRowSchema } from '$lib/domain/marking/mark';
import { inputProblem, Problem } from '$lib/domain/problem';
import { revisionsOfAttempt } from '../../data/queries/attempt-context';
import { setStepState } from '../../data/queries/enrolments';
import { findPerson, peopleWithRole, schoolById } from '../../data/queries/schools';
import { findSubmission, leaseOf } from '../../data/queries/submissions';
import { accounts, markingLeases, marks, submissions } from '../../data/models';
import { find, insert, remove, update } from '../../data/rows';
import { acrossSchools } from '../../data/scope';
import { writeCase } from '../use-case';

/** Signs a mark. The marker gives levels and words; the scheme's rule decides, in words. */
export const signMark = writeCase({
	name: 'sign-mark',
	action: 'mark:sign',
	input: z.object({
		submissionId: z.string(),
		rows: z.array(markRowSchema).max(40),
		words: z.string().trim().max(4000).default('')
	}),
	async subject({ scope, input, at }) {
		const attempt = await findSubmission(scope, input.submissionId);
		if (!attempt || attempt.state === 'open') return undefined;
		const lease = await leaseOf(scope, attempt.id);
		return {
			schoolId: scope.schoolId,
			ownerId: attempt.personId,
			leaseHolderId: holderNow(lease, at),
			attempt
		};
	},
	async run({ scope, house, subject: { attempt }, input, me, at, newId, record, mail, enqueue }) {
		if (attempt.state !== 'handed-in')
			throw new Problem('closed', 'This submission is marked already. A signed mark stands.');
		const { jobSheet } = await revisionsOfAttempt(scope, attempt);
		const faults = markFaults(jobSheet.scheme, input.rows);
		if (faults.length > 0) throw inputProblem({ rows: faults });
		const staff = new Set((await peopleWithRole(scope, 'instructor')).map((one) => one.id));
		if (input.rows.some((row) => row.witnessId !== null && !staff.has(row.witnessId)))
			throw inputProblem({ rows: ['Choose who saw it from the list of instructors.'] });
		const rows = input.rows.filter((row) =>
			jobSheet.scheme.criteria.some((one) => one.key === row.criterion)
		);
		const decision = decide(jobSheet.scheme, rows);
		const signedAt = at.toISOString();
		const markId = newId();
		await insert(scope, marks, {
			id: markId,
			submissionId: attempt.id,
			markerId: me,
			rows,
			words: input.words,
			...decision,
			signedAt
		});
		await update(
			scope,
			submissions,
			{ id: attempt.id, state: 'handed-in' },
			{ state: 'decided', decision: decision.decision, decidedAt: signedAt }
		);
		await remove(scope, markingLeases, { submissionId: attempt.id });
		const competent = decision.decision === 'competent';
		const { enrolmentId, stepKey } = attempt;
		await setStepState(
			scope,
			{ enrolmentId, stepKey },
			{
				state: competent ? 'competent' : 'sent-back',
				note: competent ? null : decision.redo.join(' '),
				updatedAt: signedAt
			}
		);
		await record({
			kind: 'mark-signed',
			subject: markId,
			data: { submission: attempt.id, decision: decision.decision, rows }
		});
		const student = await findPerson(scope, attempt.personId);
		const account =
			student && (await find(acrossSchools(scope), accounts, { id: student.accountId }));
		const school = await schoolById(scope, scope.schoolId);
		if (student && account)
			await mail({
				kind: 'submission-marked',
				to: account.email,
				payload: {
					name: student.name,
					jobSheetTitle: jobSheet.title,
					attempt: attempt.attempt,
					decision: decision.decision,
					redo: decision.redo,
					address: `${house.config.ORIGIN}/s/${school?.slug}/job-sheets/${enrolmentId}/${stepKey}/${attempt.id}`
				}
			});
		if (competent) await enqueue({ kind: 'propose-award', payload: { enrolmentId } });
		return { markId, decision: decision.decision };
	}
});
