import { instant, integer, json, key, nullable, real, schoolTable, text } from '../table';
import type { StepState } from '$lib/domain/courses/step-state';

/** One row an enrolment and step, written in the transaction that changes it. */
export const stepStates = schoolTable('step_states', {
	enrolmentId: key(),
	stepKey: key(),
	state: text<StepState>(),
	note: nullable(text()),
	score: nullable(real()),
	updatedAt: instant()
});

/** What was really watched of a film, as merged intervals in seconds. */
export const watchRecords = schoolTable('watch_records', {
	enrolmentId: key(),
	lessonId: key(),
	filmHash: key(),
	intervals: json<[number, number][]>(),
	positionS: real(),
	version: integer(),
	updatedAt: instant()
});

export const lessonReadings = schoolTable('lesson_readings', {
	enrolmentId: key(),
	lessonId: key(),
	revisionId: text(),
	openedAt: instant(),
	readAt: nullable(instant())
});

export const benchHours = schoolTable('bench_hours', {
	id: key(),
	enrolmentId: text(),
	onDay: text(),
	minutes: integer(),
	what: text(),
	witnessId: text(),
	createdAt: instant()
});
