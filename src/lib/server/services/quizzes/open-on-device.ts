import { z } from 'zod';
import { kindOf } from '$lib/domain/questions/registry';
import { countsStill } from '$lib/domain/quizzes/deadline';
import { Problem } from '$lib/domain/problem';
import { findSitting, noteFact, responsesOfSitting } from '../../data/queries/sittings';
import { revisionById } from '../../data/queries/publications';
import type { Quiz } from '$lib/domain/quizzes/schema';
import { sittings } from '../../data/models';
import { update } from '../../data/rows';
import { writeCase } from '../use-case';
import { satQuestions } from './quiz-step';

/**
 * Opens a sitting on a device: a new epoch, so that what an older device still sends is refused
 * and kept as a fact. Gives the printed faces and the responses so far; never seed or key.
 */
export const openOnDevice = writeCase({
	name: 'open-on-device',
	action: 'sitting:respond',
	input: z.object({ sittingId: z.string(), device: z.string().max(200).default('') }),
	async subject({ scope, input }) {
		const sitting = await findSitting(scope, input.sittingId);
		return sitting && { schoolId: scope.schoolId, ownerId: sitting.personId, sitting };
	},
	async run({ scope, subject: { sitting }, input, at, newId }) {
		if (sitting.state !== 'open') throw new Problem('closed', 'This sitting is handed in.');
		const deadline = sitting.deadlineAt === null ? null : Date.parse(sitting.deadlineAt);
		if (!countsStill(at.getTime(), deadline))
			throw new Problem('closed', 'The time of this sitting is over. What was saved in it counts.');
		const epoch = sitting.epoch + 1;
		await update(scope, sittings, { id: sitting.id, epoch: sitting.epoch }, { epoch });
		await noteFact(scope, {
			id: newId(),
			sittingId: sitting.id,
			kind: 'opened',
			detail: { epoch, device: input.device },
			at: at.toISOString()
		});
		const [questions, quiz] = await Promise.all([
			satQuestions(scope, sitting),
			revisionById(scope, sitting.quizRevisionId)
		]);
		const kept = await responsesOfSitting(
			scope,
			questions.map((one) => one.id)
		);
		const { title, permittedAids } = quiz?.body as Quiz;
		return {
			sittingId: sitting.id,
			title,
			permittedAids,
			number: sitting.number,
			epoch,
			startedAt: sitting.startedAt,
			deadlineAt: sitting.deadlineAt,
			serverNow: at.toISOString(),
			questions: questions.map(({ id, position, seed, question, figures }) => {
				const kind = kindOf(question.kind);
				const drawn = kind.draw(question.body, seed, figures);
				if (!drawn.ok) throw new Error(`${question.key}: ${drawn.because}`);
				const response = kept.find((one) => one.sittingQuestionId === id);
				return {
					id,
					position,
					kind: question.kind,
					face: kind.face(question.body, drawn.value),
					response: response?.body ?? null,
					given: response ? { epoch: response.epoch, number: response.number } : null
				};
			})
		};
	}
});
