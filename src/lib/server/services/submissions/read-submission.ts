import { z } from 'zod';
import { tagQrText, tagWords } from '$lib/domain/job-sheets/evidence-tag';
import { jobSheetStep } from '../../data/queries/attempt-context';
import { attemptFace } from '../../data/queries/attempt-face';
import { findPerson } from '../../data/queries/schools';
import { attemptsOf, findSubmission } from '../../data/queries/submissions';
import { qrSvg } from '../../gateways/qr/qr';
import { readCase } from '../use-case';

/** A job-sheet step of the student's own: what it asks, and every attempt so far. */
export const readJobSheetStep = readCase({
	name: 'read-job-sheet-step',
	action: 'submission:open',
	input: z.object({ enrolmentId: z.string(), stepKey: z.string() }),
	async subject({ scope, input }) {
		const found = await jobSheetStep(scope, input.enrolmentId, input.stepKey);
		return found && { schoolId: scope.schoolId, ownerId: found.enrolment.personId, ...found };
	},
	async run({ scope, subject: { enrolment, course, step, jobSheet, sheet, jobSheetRevision } }) {
		const attempts = await attemptsOf(scope, enrolment.id, step.key);
		return {
			courseTitle: course.title,
			stepNumber: course.steps.findIndex((one) => one.key === step.key) + 1,
			steps: course.steps.length,
			revision: jobSheetRevision.number,
			issuedAt: jobSheetRevision.publishedAt,
			enrolmentId: enrolment.id,
			stepKey: step.key,
			jobSheet,
			sheet,
			attempts: attempts.map((one) => ({
				id: one.id,
				attempt: one.attempt,
				state: one.state,
				handedInAt: one.handedInAt,
				decision: one.decision
			}))
		};
	}
});

export const readSubmission = readCase({
	name: 'read-submission',
	action: 'submission:read',
	input: z.object({ submissionId: z.string() }),
	async subject({ scope, input }) {
		const attempt = await findSubmission(scope, input.submissionId);
		return attempt && { schoolId: scope.schoolId, ownerId: attempt.personId, attempt };
	},
	async run({ scope, subject: { attempt } }) {
		const all = await attemptsOf(scope, attempt.enrolmentId, attempt.stepKey);
		const earlier = all.filter((one) => one.attempt < attempt.attempt).at(-1);
		const student = await findPerson(scope, attempt.personId);
		return {
			...(await attemptFace(scope, attempt)),
			enrolmentId: attempt.enrolmentId,
			stepKey: attempt.stepKey,
			studentName: student?.name ?? '',
			tagQr: qrSvg(tagQrText(attempt.tagCode), `Evidence tag ${tagWords(attempt.tagCode)}`),
			/** The attempt before this one, shown beside it. */
			earlier: earlier ? await attemptFace(scope, earlier) : null
		};
	}
});
