import { instant, integer, json, key, nullable, real, schoolTable, text } from '../table';

export type SittingState = 'open' | 'ended';

/** One student's go at a quiz. Unique indexes allow one open sitting a person. */
export const sittings = schoolTable('sittings', {
	id: key(),
	enrolmentId: text(),
	personId: text(),
	stepKey: text(),
	quizId: text(),
	quizRevisionId: text(),
	sheetRevisionId: text(),
	number: integer(),
	state: text<SittingState>(),
	/** Opening the sitting on a device begins a new epoch; saves of older ones are refused. */
	epoch: integer(),
	startedAt: instant(),
	deadlineAt: nullable(instant()),
	endedAt: nullable(instant()),
	endedBecause: nullable(text()),
	points: nullable(real()),
	possible: nullable(real()),
	passed: nullable(integer())
});

export const sittingQuestions = schoolTable('sitting_questions', {
	id: key(),
	sittingId: text(),
	position: integer(),
	questionRevisionId: text(),
	seed: text()
});

export const responses = schoolTable('responses', {
	sittingQuestionId: key(),
	epoch: integer(),
	number: integer(),
	body: json<unknown>(),
	receivedAt: instant(),
	points: nullable(real()),
	working: nullable(json<unknown>())
});

/** Unusual things as plain facts for the instructor, never as a verdict. */
export const sittingFacts = schoolTable('sitting_facts', {
	id: key(),
	sittingId: text(),
	kind: text(),
	detail: json<unknown>(),
	at: instant()
});
