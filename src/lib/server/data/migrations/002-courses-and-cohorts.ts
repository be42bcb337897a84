import { appendOnly, inSchool, schoolId } from './phrases';

/** What a school publishes, who goes through it together, and what was paid for that. */
export const coursesAndCohorts = {
	name: '002-courses-and-cohorts',
	statements: [
		`CREATE TABLE publications (
			${schoolId}, id TEXT NOT NULL,
			kind TEXT NOT NULL CHECK (kind IN ('course', 'lesson', 'question', 'quiz', 'job-sheet', 'data-sheet')),
			key TEXT NOT NULL, createdAt TEXT NOT NULL, PRIMARY KEY (schoolId, id), UNIQUE (schoolId, kind, key))`,
		`CREATE TABLE revisions (
			${schoolId}, id TEXT NOT NULL, publicationId TEXT NOT NULL, number INTEGER NOT NULL CHECK (number >= 1),
			title TEXT NOT NULL, hash TEXT NOT NULL, body TEXT NOT NULL, publishedAt TEXT NOT NULL,
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, publicationId, number),
			${inSchool('publicationId', 'publications')})`,
		...appendOnly('revisions'),
		`CREATE TABLE cohorts (
			${schoolId}, id TEXT NOT NULL, courseId TEXT NOT NULL, courseRevisionId TEXT NOT NULL, title TEXT NOT NULL,
			startsOn TEXT NOT NULL, endsOn TEXT NOT NULL CHECK (endsOn >= startsOn), instructorId TEXT NOT NULL,
			priceMinor INTEGER NOT NULL CHECK (priceMinor >= 0), currency TEXT NOT NULL, createdAt TEXT NOT NULL,
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, title), ${inSchool('courseId', 'publications')},
			${inSchool('courseRevisionId', 'revisions')}, ${inSchool('instructorId', 'people')})`,
		`CREATE TABLE orders (
			${schoolId}, id TEXT NOT NULL, cohortId TEXT NOT NULL, quantity INTEGER NOT NULL CHECK (quantity > 0),
			amountMinor INTEGER NOT NULL CHECK (amountMinor >= 0), currency TEXT NOT NULL,
			method TEXT NOT NULL CHECK (method IN ('card', 'bank-transfer', 'purchase-order')),
			state TEXT NOT NULL CHECK (state IN ('intended', 'open', 'paid', 'refused', 'expired', 'cancelled')),
			reference TEXT, checkoutId TEXT UNIQUE, checkoutUrl TEXT, paymentId TEXT, fault TEXT,
			createdBy TEXT NOT NULL, createdAt TEXT NOT NULL, settledAt TEXT,
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, cohortId, id), ${inSchool('cohortId', 'cohorts')},
			${inSchool('createdBy', 'people')}, CHECK (state <> 'paid' OR settledAt IS NOT NULL))`,
		`CREATE INDEX orders_cohort ON orders(schoolId, cohortId)`,
		`CREATE TABLE places (
			${schoolId}, id TEXT NOT NULL, cohortId TEXT NOT NULL, orderId TEXT NOT NULL,
			number INTEGER NOT NULL CHECK (number >= 1), openedAt TEXT NOT NULL,
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, cohortId, id), UNIQUE (schoolId, orderId, number),
			FOREIGN KEY (schoolId, cohortId, orderId) REFERENCES orders(schoolId, cohortId, id))`,
		`CREATE TRIGGER places_need_a_paid_order BEFORE INSERT ON places
			WHEN (SELECT state FROM orders WHERE schoolId = NEW.schoolId AND id = NEW.orderId) IS NOT 'paid'
				OR NEW.number > (SELECT quantity FROM orders WHERE schoolId = NEW.schoolId AND id = NEW.orderId)
			BEGIN SELECT RAISE(ABORT, 'a place needs a paid order'); END`,
		`CREATE TABLE roster_entries (
			${schoolId}, id TEXT NOT NULL, cohortId TEXT NOT NULL, email TEXT NOT NULL CHECK (email = lower(email)),
			name TEXT NOT NULL, studentNumber TEXT, placeId TEXT,
			state TEXT NOT NULL CHECK (state IN ('waiting', 'invited', 'enrolled', 'withdrawn')),
			invitedAt TEXT, createdAt TEXT NOT NULL, PRIMARY KEY (schoolId, id), UNIQUE (schoolId, cohortId, email),
			UNIQUE (schoolId, placeId), ${inSchool('cohortId', 'cohorts')},
			FOREIGN KEY (schoolId, cohortId, placeId) REFERENCES places(schoolId, cohortId, id),
			CHECK (state NOT IN ('invited', 'enrolled') OR placeId IS NOT NULL))`,
		`CREATE TABLE enrolments (
			${schoolId}, id TEXT NOT NULL, cohortId TEXT NOT NULL, personId TEXT NOT NULL, placeId TEXT NOT NULL,
			rosterEntryId TEXT, enrolledAt TEXT NOT NULL,
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, cohortId, personId), UNIQUE (schoolId, placeId),
			UNIQUE (schoolId, id, personId), ${inSchool('personId', 'people')},
			${inSchool('rosterEntryId', 'roster_entries')}, ${inSchool('cohortId', 'cohorts')},
			FOREIGN KEY (schoolId, cohortId, placeId) REFERENCES places(schoolId, cohortId, id))`,
		`CREATE INDEX enrolments_person ON enrolments(schoolId, personId)`,
		`CREATE TABLE payment_events (
			id TEXT PRIMARY KEY, kind TEXT NOT NULL, checkoutId TEXT, receivedAt TEXT NOT NULL, handledAt TEXT,
			outcome TEXT, hint TEXT NOT NULL)`
	]
};
