import type { Course } from '$lib/domain/courses/schema';
import type { Evidence, Task } from '$lib/domain/certificates/evidence';
import type { DataSheet } from '$lib/domain/data-sheets/schema';
import { resultOf } from '$lib/domain/quizzes/result';
import type { Quiz } from '$lib/domain/quizzes/schema';
import { sittings } from '../models';
import { select } from '../rows';
import type { SchoolScope } from '../scope';
import { minutesOf } from './bench-hours';
import { stepStatesOf, type EnrolmentLine } from './enrolments';
import { revisionById } from './publications';
import { attemptsOf } from './submissions';

/** Everything that an award is decided from, gathered from the rows as they stand now. */
export async function gatherEvidence(
	scope: SchoolScope,
	enrolment: EnrolmentLine
): Promise<{ course: Course; courseRevision: string; evidence: Evidence }> {
	const revision = await revisionById(scope, enrolment.courseRevisionId);
	if (!revision) throw new Error('an enrolment names its course');
	const course = revision.body as Course;
	const states = new Map(
		(await stepStatesOf(scope, enrolment.id)).map((one) => [one.stepKey, one])
	);
	const ofKind = (kind: string) => course.steps.filter((step) => step.kind === kind);
	const quizzes = [];
	for (const step of ofKind('quiz')) {
		const best = await bestSitting(scope, enrolment.id, step.key);
		if (best) quizzes.push({ stepKey: step.key, title: step.title, ...best });
	}
	const tasks: Task[] = [];
	for (const step of ofKind('job-sheet')) {
		const task = await newestDecided(scope, enrolment.id, step);
		if (task) tasks.push(task);
	}
	return {
		course,
		courseRevision: `revision ${revision.number}`,
		evidence: {
			steps: course.steps.map(({ key, title, kind }) => ({
				key,
				title,
				kind,
				state: states.get(key)?.state ?? 'not-begun',
				needed: true
			})),
			quizzes,
			tasks,
			bench: {
				minutes: await minutesOf(scope, enrolment.id),
				neededMinutes: Math.round(course.award.benchHours * 60)
			},
			outcomes: course.outcomes.map(({ words, shownBy }) => ({ words, shownBySteps: shownBy })),
			notAssessed: course.award.notAssessed
		}
	};
}

async function bestSitting(scope: SchoolScope, enrolmentId: string, stepKey: string) {
	const ended = await select(scope, sittings, { enrolmentId, stepKey, state: 'ended' });
	const best = ended.sort((a, b) => (b.points ?? 0) - (a.points ?? 0))[0];
	if (!best || best.points === null || !best.possible) return undefined;
	const quiz = (await revisionById(scope, best.quizRevisionId))?.body as Quiz;
	const { points, possible } = best;
	return resultOf({ points, of: possible, share: points / possible }, quiz);
}

async function newestDecided(
	scope: SchoolScope,
	enrolmentId: string,
	step: { key: string; title: string }
): Promise<Task | undefined> {
	const decided = (await attemptsOf(scope, enrolmentId, step.key)).filter(
		(one) => one.state === 'decided'
	);
	const newest = decided.at(-1);
	if (!newest?.decision || !newest.decidedAt) return undefined;
	const sheet = (await revisionById(scope, newest.sheetRevisionId))?.body as DataSheet;
	const { alone, words } = newest.body.help;
	return {
		stepKey: step.key,
		title: step.title,
		engine: sheet.code,
		how: alone ? 'alone' : 'helped',
		share: alone ? null : words,
		attempt: newest.attempt,
		decision: newest.decision,
		decidedOn: newest.decidedAt.slice(0, 10)
	};
}
