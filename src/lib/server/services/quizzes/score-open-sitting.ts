import { kindOf } from '$lib/domain/questions/registry';
import { resultOf } from '$lib/domain/quizzes/result';
import type { Quiz } from '$lib/domain/quizzes/schema';
import { scoreSitting, type ScoredItem } from '$lib/domain/quizzes/score-sitting';
import { setStepState, stepState } from '../../data/queries/enrolments';
import { revisionById } from '../../data/queries/publications';
import { responsesOfSitting } from '../../data/queries/sittings';
import { responses, sittings, type SittingState } from '../../data/models';
import { update } from '../../data/rows';
import type { RowOf } from '../../data/table';
import type { SchoolScope } from '../../data/scope';
import type { Written } from '../use-case';
import { satQuestions } from './quiz-step';

type Sitting = RowOf<typeof sittings>;
type Pen = Pick<Written, 'record' | 'enqueue'>;

/** Ends and scores a sitting in one transaction; every score is kept with its working. */
export async function scoreOpenSitting(
	scope: SchoolScope,
	sitting: Sitting,
	because: 'handed-in' | 'time-over',
	at: string,
	pen: Pen
) {
	const questions = await satQuestions(scope, sitting);
	const kept = await responsesOfSitting(
		scope,
		questions.map((one) => one.id)
	);
	const items: ScoredItem[] = [];
	for (const { id, seed, key, question, figures } of questions) {
		const kind = kindOf(question.kind);
		const drawn = kind.draw(question.body, seed, figures);
		const response = kept.find((one) => one.sittingQuestionId === id);
		if (!drawn.ok) throw new Error(`${key}: ${drawn.because}`);
		const omitted = response === undefined || kind.emptyIsOmitted(response.body);
		const score = response && kind.score(question.body, drawn.value, response.body);
		if (response && score)
			await update(
				scope,
				responses,
				{ sittingQuestionId: id },
				{
					points: score.points,
					working: { score, steps: kind.working(question.body, drawn.value) }
				}
			);
		const { points = 0, right = false } = score ?? {};
		items.push({ key, outcome: question.outcome, points, right, omitted });
	}
	const quiz = (await revisionById(scope, sitting.quizRevisionId))?.body as Quiz;
	const total = scoreSitting(items);
	const result = resultOf(total, quiz);
	const state: SittingState = 'ended';
	await update(
		scope,
		sittings,
		{ id: sitting.id, state: 'open' },
		{
			state,
			endedAt: at,
			endedBecause: because,
			points: total.points,
			possible: total.of,
			passed: result.passed ? 1 : 0
		}
	);
	const { enrolmentId, stepKey } = sitting;
	const standing = await stepState(scope, enrolmentId, stepKey);
	if (standing?.state !== 'competent')
		await setStepState(
			scope,
			{ enrolmentId, stepKey },
			{
				state: result.passed ? 'competent' : 'sent-back',
				score: total.share,
				note: result.words,
				updatedAt: at
			}
		);
	const data = { because, points: total.points, possible: total.of, passed: result.passed };
	await pen.record({ schoolId: scope.schoolId, kind: 'sitting-ended', subject: sitting.id, data });
	if (result.passed) await pen.enqueue({ kind: 'propose-award', payload: { enrolmentId } });
	return result;
}
