import { z } from 'zod';
import { tagCode } from '$lib/domain/job-sheets/evidence-tag';
import { emptySubmission } from '$lib/domain/job-sheets/submission';
import { Problem } from '$lib/domain/problem';
import { setStepState } from '../../data/queries/enrolments';
import { attemptsOf } from '../../data/queries/submissions';
import { submissions } from '../../data/models';
import { insert } from '../../data/rows';
import { writeCase } from '../use-case';
import { jobSheetStep } from '../../data/queries/attempt-context';

/** Opens an attempt with an evidence tag of its own. A second attempt begins empty beside the first. */
export const openSubmission = writeCase({
	name: 'open-submission',
	action: 'submission:open',
	input: z.object({ enrolmentId: z.string(), stepKey: z.string() }),
	async subject({ scope, input }) {
		const found = await jobSheetStep(scope, input.enrolmentId, input.stepKey);
		return found && { schoolId: scope.schoolId, ownerId: found.enrolment.personId, ...found };
	},
	async run({ scope, subject, house, me, at, newId, record }) {
		const { enrolment, step, jobSheetRevision, sheetRevision } = subject;
		const attempts = await attemptsOf(scope, enrolment.id, step.key);
		const last = attempts.at(-1);
		if (last?.state === 'open') return { submissionId: last.id, opened: false };
		if (last?.state === 'handed-in')
			throw new Problem(
				'conflict',
				'Your attempt waits to be marked. You can begin again if it comes back.'
			);
		if (last?.decision === 'competent')
			throw new Problem('conflict', 'This job sheet is done: you were found competent.');
		const id = newId();
		const tag = tagCode(house.chance(10));
		await insert(scope, submissions, {
			id,
			enrolmentId: enrolment.id,
			personId: me,
			stepKey: step.key,
			jobSheetId: jobSheetRevision.publicationId,
			jobSheetRevisionId: jobSheetRevision.id,
			sheetRevisionId: sheetRevision.id,
			attempt: (last?.attempt ?? 0) + 1,
			state: 'open',
			tagCode: tag,
			version: 0,
			body: emptySubmission,
			openedAt: at.toISOString(),
			handedInAt: null,
			decidedAt: null,
			decision: null
		});
		await setStepState(
			scope,
			{ enrolmentId: enrolment.id, stepKey: step.key },
			{ state: 'under-way', updatedAt: at.toISOString() }
		);
		const data = { jobSheetRevision: jobSheetRevision.id, attempt: (last?.attempt ?? 0) + 1 };
		await record({ kind: 'submission-opened', subject: id, data });
		return { submissionId: id, opened: true };
	}
});
