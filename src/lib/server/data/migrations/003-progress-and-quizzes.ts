import { inSchool, schoolId } from './phrases';

const ofEnrolment =
	'FOREIGN KEY (schoolId, enrolmentId, personId) REFERENCES enrolments(schoolId, id, personId)';

/** How far each enrolment has come, and the sittings of its quizzes. */
export const progressAndQuizzes = {
	name: '003-progress-and-quizzes',
	statements: [
		`CREATE TABLE step_states (
			${schoolId}, enrolmentId TEXT NOT NULL, stepKey TEXT NOT NULL,
			state TEXT NOT NULL CHECK (state IN ('not-begun', 'under-way', 'waiting', 'sent-back', 'competent')),
			note TEXT, score REAL, updatedAt TEXT NOT NULL,
			PRIMARY KEY (schoolId, enrolmentId, stepKey), ${inSchool('enrolmentId', 'enrolments')})`,
		`CREATE TABLE watch_records (
			${schoolId}, enrolmentId TEXT NOT NULL, lessonId TEXT NOT NULL, filmHash TEXT NOT NULL,
			intervals TEXT NOT NULL, positionS REAL NOT NULL, version INTEGER NOT NULL, updatedAt TEXT NOT NULL,
			PRIMARY KEY (schoolId, enrolmentId, lessonId, filmHash), ${inSchool('enrolmentId', 'enrolments')},
			${inSchool('lessonId', 'publications')})`,
		`CREATE TABLE lesson_readings (
			${schoolId}, enrolmentId TEXT NOT NULL, lessonId TEXT NOT NULL, revisionId TEXT NOT NULL,
			openedAt TEXT NOT NULL, readAt TEXT, PRIMARY KEY (schoolId, enrolmentId, lessonId),
			${inSchool('enrolmentId', 'enrolments')}, ${inSchool('lessonId', 'publications')},
			${inSchool('revisionId', 'revisions')})`,
		`CREATE TABLE bench_hours (
			${schoolId}, id TEXT NOT NULL, enrolmentId TEXT NOT NULL, onDay TEXT NOT NULL,
			minutes INTEGER NOT NULL CHECK (minutes BETWEEN 1 AND 1440), what TEXT NOT NULL, witnessId TEXT NOT NULL,
			createdAt TEXT NOT NULL, PRIMARY KEY (schoolId, id), ${inSchool('enrolmentId', 'enrolments')},
			${inSchool('witnessId', 'people')})`,
		`CREATE INDEX bench_hours_enrolment ON bench_hours(schoolId, enrolmentId)`,
		`CREATE TABLE sittings (
			${schoolId}, id TEXT NOT NULL, enrolmentId TEXT NOT NULL, personId TEXT NOT NULL, stepKey TEXT NOT NULL,
			quizId TEXT NOT NULL, quizRevisionId TEXT NOT NULL, sheetRevisionId TEXT NOT NULL,
			number INTEGER NOT NULL CHECK (number >= 1), state TEXT NOT NULL CHECK (state IN ('open', 'ended')),
			epoch INTEGER NOT NULL CHECK (epoch >= 0), startedAt TEXT NOT NULL, deadlineAt TEXT, endedAt TEXT,
			endedBecause TEXT, points REAL, possible REAL, passed INTEGER CHECK (passed IN (0, 1)),
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, enrolmentId, stepKey, number), ${ofEnrolment},
			${inSchool('quizId', 'publications')}, ${inSchool('quizRevisionId', 'revisions')},
			${inSchool('sheetRevisionId', 'revisions')},
			CHECK ((state = 'ended') = (endedAt IS NOT NULL)))`,
		`CREATE UNIQUE INDEX sittings_one_open ON sittings(schoolId, personId) WHERE state = 'open'`,
		`CREATE INDEX sittings_deadline ON sittings(state, deadlineAt)`,
		`CREATE TABLE sitting_questions (
			${schoolId}, id TEXT NOT NULL, sittingId TEXT NOT NULL, position INTEGER NOT NULL,
			questionRevisionId TEXT NOT NULL, seed TEXT NOT NULL, PRIMARY KEY (schoolId, id),
			UNIQUE (schoolId, sittingId, position), ${inSchool('sittingId', 'sittings')},
			${inSchool('questionRevisionId', 'revisions')})`,
		`CREATE TABLE responses (
			${schoolId}, sittingQuestionId TEXT NOT NULL, epoch INTEGER NOT NULL, number INTEGER NOT NULL,
			body TEXT NOT NULL, receivedAt TEXT NOT NULL, points REAL CHECK (points BETWEEN 0 AND 1), working TEXT,
			PRIMARY KEY (schoolId, sittingQuestionId), ${inSchool('sittingQuestionId', 'sitting_questions')})`,
		`CREATE TABLE sitting_facts (
			${schoolId}, id TEXT NOT NULL, sittingId TEXT NOT NULL, kind TEXT NOT NULL, detail TEXT NOT NULL,
			at TEXT NOT NULL, PRIMARY KEY (schoolId, id), ${inSchool('sittingId', 'sittings')})`,
		`CREATE INDEX sitting_facts_sitting ON sitting_facts(schoolId, sittingId)`
	]
};
