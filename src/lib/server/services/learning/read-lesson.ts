import { z } from 'zod';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { gaps, mergeIntervals } from '$lib/kernel/captions/watched';
import { stepState } from '../../data/queries/enrolments';
import { lessonReading, watchRecord } from '../../data/queries/lessons';
import { newestRevision, revisionById } from '../../data/queries/publications';
import { readCase } from '../use-case';
import { lessonStep } from './lesson-step';

const input = z.object({ enrolmentId: z.string(), stepKey: z.string() });

/** A lesson as a student reads it: its values, what was watched, and what changed since last time. */
export const readLesson = readCase({
	name: 'read-lesson',
	action: 'film:watch',
	input,
	async subject({ scope, input }) {
		const found = await lessonStep(scope, input.enrolmentId, input.stepKey);
		return found && { schoolId: scope.schoolId, ownerId: found.enrolment.personId, ...found };
	},
	async run({ scope, house, subject: { enrolment, course, step, revision, body } }) {
		const lesson = house.catalogue.lessonByKey(body.key);
		const lessonId = revision.publicationId;
		const [sheet, watched, reading, state] = await Promise.all([
			newestRevision(scope, 'data-sheet', course.engine),
			body.filmHash ? watchRecord(scope, enrolment.id, lessonId, body.filmHash) : undefined,
			lessonReading(scope, enrolment.id, lessonId),
			stepState(scope, enrolment.id, step.key)
		]);
		const readBefore =
			reading && reading.revisionId !== revision.id
				? await revisionById(scope, reading.revisionId)
				: undefined;
		const intervals = mergeIntervals(watched?.intervals ?? []);
		const at = course.steps.findIndex((one) => one.key === step.key);
		return {
			/** Where the text's component lies; the page fetches it. */
			file: lesson?.file ?? null,
			filmFiles: lesson?.filmFiles ?? null,
			title: body.title,
			drawnBy: body.drawnBy,
			courseTitle: course.title,
			outcomes: course.outcomes.filter((one) => one.shownBy.includes(step.key)),
			stepNumber: at + 1,
			steps: course.steps.length,
			next: course.steps[at + 1] ?? null,
			revision: revision.number,
			issuedAt: revision.publishedAt,
			enrolmentId: enrolment.id,
			stepKey: step.key,
			sheet: sheet ? dataSheetSchema.parse(sheet.body) : null,
			state: state?.state ?? 'not-begun',
			film: body.filmHash
				? {
						hash: body.filmHash,
						seconds: body.filmSeconds ?? 0,
						watched: intervals,
						notYetSeen: gaps(intervals, body.filmSeconds ?? 0),
						positionS: watched?.positionS ?? 0
					}
				: null,
			/** The revision that this student read last, where it is an older one. */
			changedSince: readBefore ? { number: readBefore.number } : null
		};
	}
});
