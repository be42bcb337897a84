import { z } from 'zod';
import { kindOf } from '$lib/domain/questions/registry';
import { countsStill } from '$lib/domain/quizzes/deadline';
import { accept } from '$lib/domain/sync/accept';
import { inputProblem, Problem } from '$lib/domain/problem';
import { revisionById } from '../../data/queries/publications';
import {
	findSitting,
	keepResponse,
	noteFact,
	questionsOfSitting,
	responsesOfSitting
} from '../../data/queries/sittings';
import type { Question } from '$lib/domain/questions/schema';
import { writeCase } from '../use-case';

/**
 * Saves one response as it is given. When this answers "saved" it is on the disk. Late, repeated
 * and reordered saves, and those of a device that was left, never undo a newer one.
 */
export const saveResponse = writeCase({
	name: 'save-response',
	action: 'sitting:respond',
	input: z.object({
		sittingId: z.string(),
		questionId: z.string(),
		epoch: z.number().int().min(1),
		number: z.number().int().min(0),
		response: z.unknown()
	}),
	async subject({ scope, input }) {
		const sitting = await findSitting(scope, input.sittingId);
		return sitting && { schoolId: scope.schoolId, ownerId: sitting.personId, sitting };
	},
	async run({ scope, subject: { sitting }, input, at, newId }) {
		const { questionId, epoch, number } = input;
		const deadline = sitting.deadlineAt === null ? null : Date.parse(sitting.deadlineAt);
		if (sitting.state !== 'open' || !countsStill(at.getTime(), deadline))
			throw new Problem('closed', 'This sitting has ended. What was saved before that counts.');
		const row = (await questionsOfSitting(scope, sitting.id)).find((one) => one.id === questionId);
		const revision = row && (await revisionById(scope, row.questionRevisionId));
		if (!revision) throw new Problem('absent', 'This question is not part of the sitting.');
		const kind = kindOf((revision.body as Question).kind);
		const parsed = kind.responseSchema.safeParse(input.response);
		if (!parsed.success)
			throw inputProblem({ response: ['This response has not the form of its question.'] });
		const [standing] = await responsesOfSitting(scope, [questionId]);
		const verdict = accept({ openEpoch: sitting.epoch, last: standing ?? null }, { epoch, number });
		const receivedAt = at.toISOString();
		if (verdict === 'other-epoch') {
			await noteFact(scope, {
				id: newId(),
				sittingId: sitting.id,
				kind: 'save-from-earlier-device',
				detail: { questionId, epoch, number },
				at: receivedAt
			});
			return { verdict, epoch: sitting.epoch };
		}
		if (verdict === 'take')
			await keepResponse(
				scope,
				{ sittingQuestionId: questionId, epoch, number, body: parsed.data, receivedAt },
				standing === undefined
			);
		return { verdict, savedAt: receivedAt };
	}
});
