import { z } from 'zod';
import { drawSitting } from '$lib/domain/quizzes/draw-sitting';
import { deadlineOf } from '$lib/domain/quizzes/deadline';
import { mayBegin } from '$lib/domain/quizzes/may-begin';
import { poolFor } from '$lib/domain/quizzes/pool-for';
import type { Question } from '$lib/domain/questions/schema';
import { Problem } from '$lib/domain/problem';
import { setStepState, stepState } from '../../data/queries/enrolments';
import { newestRevisions } from '../../data/queries/publications';
import { findPerson } from '../../data/queries/schools';
import { openSittingOf, questionsHadBefore, sittingsOf } from '../../data/queries/sittings';
import { sittingQuestions, sittings } from '../../data/models';
import { insert, insertAll } from '../../data/rows';
import { writeCase } from '../use-case';
import { quizStep } from './quiz-step';

/** Begins a sitting: questions and seeds are drawn once and kept; the deadline is a stored instant. */
export const beginSitting = writeCase({
	name: 'begin-sitting',
	action: 'sitting:open',
	input: z.object({ enrolmentId: z.string(), stepKey: z.string() }),
	async subject({ scope, input }) {
		const found = await quizStep(scope, input.enrolmentId, input.stepKey);
		return found && { schoolId: scope.schoolId, ownerId: found.enrolment.personId, ...found };
	},
	async run({ scope, house, subject, me, at, newId, record }) {
		const { enrolment, course, step, quiz, quizRevision, sheetRevision } = subject;
		const open = await openSittingOf(scope, me);
		if (open?.enrolmentId === enrolment.id && open.stepKey === step.key)
			return { sittingId: open.id };
		if (open)
			throw new Problem('conflict', 'Another quiz is open. Hand it in before you begin this one.');
		const earlier = await sittingsOf(scope, enrolment.id, step.key);
		const allowed = mayBegin(
			quiz,
			earlier.map((one) => ({
				handedInAtMs: one.endedAt === null ? null : Date.parse(one.endedAt),
				passed: one.passed === 1
			})),
			at.getTime()
		);
		if (!allowed.ok) throw new Problem('conflict', allowed.because);

		const drawer = await newestRevisions(scope, 'question');
		const pool = poolFor(
			course,
			drawer.map(({ id, key, body }) => ({ ...(body as Question), key, revisionId: id }))
		);
		const seed = Buffer.from(house.chance(16)).toString('hex');
		const drawn = drawSitting(
			quiz,
			pool,
			seed,
			await questionsHadBefore(scope, me, quizRevision.publicationId)
		);
		if (!drawn.ok)
			throw new Problem('conflict', 'This quiz cannot be drawn: {because}. Tell your instructor.', {
				because: drawn.because
			});
		const person = await findPerson(scope, me);
		const deadline = deadlineOf(
			at.getTime(),
			quiz.timeLimitMinutes,
			(person?.extraTimePercent ?? 0) / 100
		);
		const sittingId = newId();
		await insert(scope, sittings, {
			id: sittingId,
			enrolmentId: enrolment.id,
			personId: me,
			stepKey: step.key,
			quizId: quizRevision.publicationId,
			quizRevisionId: quizRevision.id,
			sheetRevisionId: sheetRevision.id,
			number: allowed.attempt,
			state: 'open',
			epoch: 0,
			startedAt: at.toISOString(),
			deadlineAt: deadline === null ? null : new Date(deadline).toISOString(),
			endedAt: null,
			endedBecause: null,
			points: null,
			possible: null,
			passed: null
		});
		const revisionOf = new Map(pool.map((one) => [one.key, one.revisionId]));
		await insertAll(
			scope,
			sittingQuestions,
			drawn.value.map((item) => ({
				id: newId(),
				sittingId,
				position: item.place,
				questionRevisionId: revisionOf.get(item.key) ?? '',
				seed: item.seed
			}))
		);
		const standing = await stepState(scope, enrolment.id, step.key);
		if (standing?.state !== 'competent')
			await setStepState(
				scope,
				{ enrolmentId: enrolment.id, stepKey: step.key },
				{ state: 'under-way', updatedAt: at.toISOString() }
			);
		const data = { quizRevision: quizRevision.id, number: allowed.attempt };
		await record({ kind: 'sitting-begun', subject: sittingId, data });
		return { sittingId };
	}
});
