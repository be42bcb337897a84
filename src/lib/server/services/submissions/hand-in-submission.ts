import { z } from 'zod';
import { missingFrom } from '$lib/domain/job-sheets/complete';
import { slips } from '$lib/domain/job-sheets/results';
import { inputProblem, Problem } from '$lib/domain/problem';
import { setStepState } from '../../data/queries/enrolments';
import { findSubmission, photographsOf } from '../../data/queries/submissions';
import { submissions } from '../../data/models';
import { update } from '../../data/rows';
import { writeCase } from '../use-case';
import { revisionsOfAttempt } from '../../data/queries/attempt-context';

export const handInSubmission = writeCase({
	name: 'hand-in-submission',
	action: 'submission:work',
	input: z.object({ submissionId: z.string(), baseVersion: z.coerce.number().int().min(0) }),
	async subject({ scope, input }) {
		const attempt = await findSubmission(scope, input.submissionId);
		return attempt && { schoolId: scope.schoolId, ownerId: attempt.personId, attempt };
	},
	async run({ scope, subject: { attempt }, input, at, record }) {
		if (attempt.state !== 'open') throw new Problem('closed', 'This attempt is handed in already.');
		if (attempt.version !== input.baseVersion)
			throw new Problem(
				'stale',
				'This job sheet was changed elsewhere. Load it again, then hand it in.'
			);
		const { jobSheet } = await revisionsOfAttempt(scope, attempt);
		const photographs = await photographsOf(scope, attempt.id);
		const missing = [
			...missingFrom(jobSheet, attempt.body, photographs),
			...slips(jobSheet.grids, attempt.body.readings)
		];
		if (missing.length > 0) throw inputProblem({ missing });
		const now = at.toISOString();
		await update(
			scope,
			submissions,
			{ id: attempt.id, state: 'open' },
			{ state: 'handed-in', handedInAt: now }
		);
		await setStepState(
			scope,
			{ enrolmentId: attempt.enrolmentId, stepKey: attempt.stepKey },
			{ state: 'waiting', updatedAt: now }
		);
		const hashes = photographs.map((one) => one.originalSha256);
		await record({
			kind: 'submission-handed-in',
			subject: attempt.id,
			data: { photographs: hashes }
		});
		return { handedInAt: now };
	}
});
