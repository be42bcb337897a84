import { z } from 'zod';
import {
	applyOperation,
	operationSchema,
	submissionBodySchema
} from '$lib/domain/job-sheets/submission';
import { resultsOf } from '$lib/domain/job-sheets/results';
import { Problem } from '$lib/domain/problem';
import { findPhotograph, findSubmission } from '../../data/queries/submissions';
import { submissions } from '../../data/models';
import { update } from '../../data/rows';
import { writeCase } from '../use-case';
import { revisionsOfAttempt } from '../../data/queries/attempt-context';

/**
 * Takes operations from the student's page, each on top of a version that the page names. Where
 * another device was faster both sides are sent back to be shown; nothing is overwritten.
 */
export const workOnSubmission = writeCase({
	name: 'work-on-submission',
	action: 'submission:work',
	input: z.object({
		submissionId: z.string(),
		baseVersion: z.number().int().min(0),
		operations: z.array(operationSchema).min(1).max(200)
	}),
	async subject({ scope, input }) {
		const attempt = await findSubmission(scope, input.submissionId);
		return attempt && { schoolId: scope.schoolId, ownerId: attempt.personId, attempt };
	},
	async run({ scope, subject: { attempt }, input }) {
		if (attempt.state !== 'open')
			throw new Problem('closed', 'This attempt is handed in. It cannot be changed any more.');
		if (attempt.version !== input.baseVersion)
			throw new Problem(
				'stale',
				'This job sheet was changed on another device. Look at both and choose.',
				{},
				{},
				{ version: attempt.version, body: attempt.body, yours: input.operations }
			);
		const { jobSheet, sheet } = await revisionsOfAttempt(scope, attempt);
		const shapes = Object.fromEntries(
			jobSheet.grids.map((one) => [one.key, { rows: one.rows.length, columns: one.columns.length }])
		);
		for (const one of input.operations)
			if (one.kind === 'finding') {
				const photograph = await findPhotograph(scope, one.finding.photographId);
				if (photograph?.submissionId !== attempt.id || photograph.removedAt)
					throw new Problem('input', 'Pin the finding in a photograph of this attempt.');
			}
		const body = submissionBodySchema.parse(
			input.operations.reduce((held, one) => applyOperation(held, one, shapes), attempt.body)
		);
		const version = attempt.version + 1;
		const changed = await update(
			scope,
			submissions,
			{ id: attempt.id, state: 'open', version: attempt.version },
			{ body, version }
		);
		if (changed !== 1) throw new Problem('conflict', 'Somebody was faster. Load the page again.');
		return { version, results: resultsOf(jobSheet, sheet, body.readings) };
	}
});
