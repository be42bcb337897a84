import { z } from 'zod';
import { filmWatched } from '$lib/domain/courses/lesson-rule';
import { coverage, gaps, mergeIntervals } from '$lib/kernel/captions/watched';
import { inputProblem, Problem } from '$lib/domain/problem';
import { setStepState, stepState } from '../../data/queries/enrolments';
import { keepReading, keepWatched, lessonReading, watchRecord } from '../../data/queries/lessons';
import type { SchoolScope } from '../../data/scope';
import { writeCase } from '../use-case';
import { lessonStep } from './lesson-step';

const where = { enrolmentId: z.string(), stepKey: z.string() };
const seconds = z
	.number()
	.min(0)
	.max(24 * 3600);

async function stepHere(work: {
	scope: SchoolScope;
	input: { enrolmentId: string; stepKey: string };
}) {
	const { scope, input } = work;
	const found = await lessonStep(scope, input.enrolmentId, input.stepKey);
	return found && { schoolId: scope.schoolId, ownerId: found.enrolment.personId, ...found };
}

/**
 * Adds watched stretches of a film. Union only: two devices, late or repeated reports never take
 * anything away. A report cannot claim more than has passed on the clock since the last one.
 */
export const watchFilm = writeCase({
	name: 'watch-film',
	action: 'film:watch',
	input: z.object({
		...where,
		filmHash: z.string(),
		positionS: seconds,
		intervals: z.array(z.tuple([seconds, seconds])).max(200)
	}),
	subject: stepHere,
	async run({ scope, subject: { enrolment, step, revision, body }, input, at }) {
		if (body.filmHash !== input.filmHash)
			throw new Problem('stale', 'The film of this lesson was replaced. Load the page again.');
		const length = body.filmSeconds ?? 0;
		if (input.intervals.some(([from, to]) => to < from || from > length + 2))
			throw inputProblem({ intervals: ['A stretch ends after it begins, within the film.'] });
		const held = await watchRecord(scope, enrolment.id, revision.publicationId, input.filmHash);
		const clipped = input.intervals.map(([from, to]): [number, number] => [
			Math.min(from, length),
			Math.min(to, length)
		]);
		const intervals = mergeIntervals([...(held?.intervals ?? []), ...clipped]);
		await keepWatched(scope, {
			enrolmentId: enrolment.id,
			lessonId: revision.publicationId,
			filmHash: input.filmHash,
			intervals,
			positionS: Math.min(input.positionS, length),
			version: (held?.version ?? 0) + 1,
			updatedAt: at.toISOString()
		});
		const standing = await stepState(scope, enrolment.id, step.key);
		if (standing?.state === 'not-begun')
			await setStepState(
				scope,
				{ enrolmentId: enrolment.id, stepKey: step.key },
				{ state: 'under-way', updatedAt: at.toISOString() }
			);
		return {
			watched: intervals,
			notYetSeen: gaps(intervals, length),
			share: coverage(intervals, length)
		};
	}
});

/** Opening a lesson notes which revision was opened. */
export const openLesson = writeCase({
	name: 'open-lesson',
	action: 'lesson:finish',
	input: z.object(where),
	subject: stepHere,
	async run({ scope, subject: { enrolment, step, revision }, at }) {
		const now = at.toISOString();
		const held = await lessonReading(scope, enrolment.id, revision.publicationId);
		if (!held)
			await keepReading(scope, {
				enrolmentId: enrolment.id,
				lessonId: revision.publicationId,
				revisionId: revision.id,
				openedAt: now,
				readAt: null
			});
		const standing = await stepState(scope, enrolment.id, step.key);
		if (standing?.state === 'not-begun')
			await setStepState(
				scope,
				{ enrolmentId: enrolment.id, stepKey: step.key },
				{ state: 'under-way', updatedAt: now }
			);
		return { opened: revision.id };
	}
});

/** "I have read this": accepted once the film, where there is one, was really watched. */
export const finishLesson = writeCase({
	name: 'finish-lesson',
	action: 'lesson:finish',
	input: z.object(where),
	subject: stepHere,
	async run({ scope, subject: { enrolment, step, revision, body }, at, record, enqueue }) {
		const now = at.toISOString();
		if (body.filmHash) {
			const held = await watchRecord(scope, enrolment.id, revision.publicationId, body.filmHash);
			const seen = filmWatched(held?.intervals ?? [], body.filmSeconds ?? 0);
			if (!seen.ok) throw new Problem('conflict', seen.because);
		}
		await keepReading(scope, {
			enrolmentId: enrolment.id,
			lessonId: revision.publicationId,
			revisionId: revision.id,
			openedAt: now,
			readAt: now
		});
		await setStepState(
			scope,
			{ enrolmentId: enrolment.id, stepKey: step.key },
			{ state: 'competent', updatedAt: now }
		);
		await record({
			kind: 'lesson-read',
			subject: enrolment.id,
			data: { lessonRevision: revision.id }
		});
		await enqueue({ kind: 'propose-award', payload: { enrolmentId: enrolment.id } });
		return { read: true };
	}
});
