import { z } from 'zod';
import type { Course } from '$lib/domain/courses/schema';
import { kindOf } from '$lib/domain/questions/registry';
import { mayBegin } from '$lib/domain/quizzes/may-begin';
import { passRuleWords, resultOf } from '$lib/domain/quizzes/result';
import { questionCount, type Quiz } from '$lib/domain/quizzes/schema';
import { findEnrolment } from '../../data/queries/enrolments';
import { findPerson, schoolById } from '../../data/queries/schools';
import { revisionById } from '../../data/queries/publications';
import { findSitting, responsesOfSitting, sittingsOf } from '../../data/queries/sittings';
import { readCase } from '../use-case';
import { quizStep, satQuestions } from './quiz-step';

/** The quiz's own page: what it asks of you, your sittings so far, and whether you may begin. */
export const readQuizStep = readCase({
	name: 'read-quiz-step',
	action: 'sitting:open',
	input: z.object({ enrolmentId: z.string(), stepKey: z.string() }),
	async subject({ scope, input }) {
		const found = await quizStep(scope, input.enrolmentId, input.stepKey);
		return found && { schoolId: scope.schoolId, ownerId: found.enrolment.personId, ...found };
	},
	async run({ scope, subject: { enrolment, course, step, quiz, quizRevision }, me, at }) {
		const [sat, person] = await Promise.all([
			sittingsOf(scope, enrolment.id, step.key),
			findPerson(scope, me)
		]);
		const questions = questionCount(quiz);
		return {
			courseTitle: course.title,
			stepNumber: course.steps.findIndex((one) => one.key === step.key) + 1,
			steps: course.steps.length,
			revision: quizRevision.number,
			issuedAt: quizRevision.publishedAt,
			enrolmentId: enrolment.id,
			stepKey: step.key,
			title: quiz.title,
			intro: quiz.intro,
			questions,
			timeLimitMinutes: quiz.timeLimitMinutes,
			extraTimePercent: person?.extraTimePercent ?? 0,
			attempts: quiz.attempts,
			waitHours: quiz.waitHours,
			permittedAids: quiz.permittedAids,
			passRule: passRuleWords(quiz, questions),
			open: sat.find((one) => one.state === 'open')?.id ?? null,
			mayBegin: mayBegin(
				quiz,
				sat.map((one) => ({
					handedInAtMs: one.endedAt === null ? null : Date.parse(one.endedAt),
					passed: one.passed === 1
				})),
				at.getTime()
			),
			sittings: sat
				.filter((one) => one.state === 'ended')
				.map(({ id, number, endedAt, points, possible, passed }) => ({
					id,
					number,
					endedAt,
					points,
					possible,
					passed: passed === 1
				}))
		};
	}
});

/** The frame of an open sitting; its questions come when it is opened on a device. */
export const readOpenSitting = readCase({
	name: 'read-open-sitting',
	action: 'sitting:read',
	input: z.object({ sittingId: z.string() }),
	async subject({ scope, input }) {
		const sitting = await findSitting(scope, input.sittingId);
		return sitting && { schoolId: scope.schoolId, ownerId: sitting.personId, sitting };
	},
	async run({ scope, subject: { sitting } }) {
		const [quiz, sheet] = await Promise.all([
			revisionById(scope, sitting.quizRevisionId),
			revisionById(scope, sitting.sheetRevisionId)
		]);
		const school = await schoolById(scope, scope.schoolId);
		return {
			sittingId: sitting.id,
			state: sitting.state,
			number: sitting.number,
			startedAt: sitting.startedAt,
			title: (quiz?.body as Quiz).title,
			sheetCode: sheet?.key.toUpperCase() ?? '',
			sheetHref: sheet ? `/s/${school?.slug}/data-sheets/${sheet.key}` : null
		};
	}
});

/** After handing in: response, right answer with its working, source, and where to read again. */
export const readSittingResult = readCase({
	name: 'read-sitting-result',
	action: 'sitting:read',
	input: z.object({ sittingId: z.string() }),
	async subject({ scope, input }) {
		const sitting = await findSitting(scope, input.sittingId);
		// The key never leaves the server while a sitting is open.
		if (sitting?.state !== 'ended') return undefined;
		return { schoolId: scope.schoolId, ownerId: sitting.personId, sitting };
	},
	async run({ scope, subject: { sitting } }) {
		const [questions, revision] = await Promise.all([
			satQuestions(scope, sitting),
			revisionById(scope, sitting.quizRevisionId)
		]);
		const kept = await responsesOfSitting(
			scope,
			questions.map((one) => one.id)
		);
		const enrolment = await findEnrolment(scope, sitting.enrolmentId);
		const course = enrolment && (await revisionById(scope, enrolment.courseRevisionId));
		const steps = (course?.body as Course | undefined)?.steps ?? [];
		const stepOf = (lesson: string) =>
			steps.find((one) => one.kind === 'lesson' && one.ref === lesson)?.key ?? null;
		const quiz = revision?.body as Quiz;
		const { points, possible } = sitting;
		const of = possible ?? questions.length;
		const got = points ?? 0;
		return {
			sittingId: sitting.id,
			enrolmentId: sitting.enrolmentId,
			stepKey: sitting.stepKey,
			title: quiz.title,
			number: sitting.number,
			startedAt: sitting.startedAt,
			endedAt: sitting.endedAt,
			endedBecause: sitting.endedBecause,
			...resultOf({ points: got, of, share: got / of }, quiz),
			questions: questions.map(({ id, position, seed, question, figures }) => {
				const kind = kindOf(question.kind);
				const drawn = kind.draw(question.body, seed, figures);
				if (!drawn.ok) throw new Error(`${question.key}: ${drawn.because}`);
				const found = kept.find((one) => one.sittingQuestionId === id);
				// What was given and cleared again was left out, not got wrong.
				const response = found && !kind.emptyIsOmitted(found.body) ? found : undefined;
				return {
					id,
					position,
					kind: question.kind,
					face: kind.face(question.body, drawn.value),
					response: response?.body ?? null,
					said: response ? kind.said(question.body, drawn.value, response.body) : null,
					score: response ? kind.score(question.body, drawn.value, response.body) : null,
					answer: kind.answer(question.body, drawn.value),
					working: kind.working(question.body, drawn.value),
					source: question.source,
					readAgain: { step: stepOf(question.readAgain.lesson), anchor: question.readAgain.anchor }
				};
			})
		};
	}
});
