import { appendOnly, inSchool, schoolId } from './phrases';

const decision = `decision IN ('competent', 'not-yet')`;

/** What is handed in and marked, and what follows from it. */
export const jobSheetsAndAwards = {
	name: '004-job-sheets-and-awards',
	statements: [
		`CREATE TABLE submissions (
			${schoolId}, id TEXT NOT NULL, enrolmentId TEXT NOT NULL, personId TEXT NOT NULL, stepKey TEXT NOT NULL,
			jobSheetId TEXT NOT NULL, jobSheetRevisionId TEXT NOT NULL, sheetRevisionId TEXT NOT NULL,
			attempt INTEGER NOT NULL CHECK (attempt >= 1),
			state TEXT NOT NULL CHECK (state IN ('open', 'handed-in', 'decided', 'void')),
			tagCode TEXT NOT NULL UNIQUE, version INTEGER NOT NULL, body TEXT NOT NULL, openedAt TEXT NOT NULL,
			handedInAt TEXT, decidedAt TEXT, decision TEXT CHECK (${decision}),
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, enrolmentId, stepKey, attempt),
			FOREIGN KEY (schoolId, enrolmentId, personId) REFERENCES enrolments(schoolId, id, personId),
			${inSchool('jobSheetId', 'publications')}, ${inSchool('jobSheetRevisionId', 'revisions')},
			${inSchool('sheetRevisionId', 'revisions')},
			CHECK ((state = 'decided') = (decision IS NOT NULL)),
			CHECK (state NOT IN ('handed-in', 'decided') OR handedInAt IS NOT NULL))`,
		`CREATE UNIQUE INDEX submissions_one_open ON submissions(schoolId, enrolmentId, stepKey)
			WHERE state IN ('open', 'handed-in')`,
		`CREATE INDEX submissions_waiting ON submissions(schoolId, state, handedInAt)`,
		`CREATE TABLE files (
			${schoolId}, id TEXT NOT NULL, sha256 TEXT NOT NULL CHECK (length(sha256) = 64), mediaType TEXT NOT NULL,
			bytes INTEGER NOT NULL, role TEXT NOT NULL CHECK (role IN ('original', 'copy', 'certificate')),
			widthPx INTEGER, heightPx INTEGER, createdAt TEXT NOT NULL, PRIMARY KEY (schoolId, id))`,
		`CREATE INDEX files_hash ON files(schoolId, sha256)`,
		`CREATE TABLE photographs (
			${schoolId}, id TEXT NOT NULL, submissionId TEXT NOT NULL, shotKey TEXT NOT NULL,
			originalFileId TEXT NOT NULL, originalSha256 TEXT NOT NULL, smallFileId TEXT, mediumFileId TEXT,
			largeFileId TEXT, state TEXT NOT NULL CHECK (state IN ('received', 'ready', 'refused')), fault TEXT,
			tagFound TEXT CHECK (tagFound IN ('this-attempt', 'another', 'none')), likeness TEXT, takenInAt TEXT NOT NULL,
			removedAt TEXT, PRIMARY KEY (schoolId, id), ${inSchool('submissionId', 'submissions')},
			${inSchool('originalFileId', 'files')}, ${inSchool('smallFileId', 'files')},
			${inSchool('mediumFileId', 'files')}, ${inSchool('largeFileId', 'files')})`,
		`CREATE INDEX photographs_submission ON photographs(schoolId, submissionId)`,
		`CREATE INDEX photographs_hash ON photographs(schoolId, originalSha256)`,
		`CREATE TABLE marking_leases (
			${schoolId}, submissionId TEXT NOT NULL, markerId TEXT NOT NULL, untilAt TEXT NOT NULL,
			PRIMARY KEY (schoolId, submissionId), ${inSchool('submissionId', 'submissions')},
			${inSchool('markerId', 'people')})`,
		`CREATE TABLE marks (
			${schoolId}, id TEXT NOT NULL, submissionId TEXT NOT NULL, markerId TEXT NOT NULL, rows TEXT NOT NULL,
			words TEXT NOT NULL, decision TEXT NOT NULL CHECK (${decision}), because TEXT NOT NULL, redo TEXT NOT NULL,
			signedAt TEXT NOT NULL, PRIMARY KEY (schoolId, id), UNIQUE (schoolId, submissionId),
			${inSchool('submissionId', 'submissions')}, ${inSchool('markerId', 'people')})`,
		...appendOnly('marks'),
		`CREATE TABLE awards (
			${schoolId}, id TEXT NOT NULL, enrolmentId TEXT NOT NULL,
			state TEXT NOT NULL CHECK (state IN ('waiting', 'awarded', 'declined')), rule TEXT NOT NULL,
			evidence TEXT NOT NULL, because TEXT NOT NULL, proposedAt TEXT NOT NULL, decidedBy TEXT, decidedAt TEXT,
			reason TEXT, PRIMARY KEY (schoolId, id), ${inSchool('enrolmentId', 'enrolments')},
			${inSchool('decidedBy', 'people')}, CHECK ((state = 'waiting') = (decidedBy IS NULL)))`,
		`CREATE UNIQUE INDEX awards_one_standing ON awards(schoolId, enrolmentId)
			WHERE state IN ('waiting', 'awarded')`,
		`CREATE TABLE certificates (
			${schoolId}, id TEXT NOT NULL, awardId TEXT NOT NULL, personId TEXT NOT NULL, code TEXT NOT NULL UNIQUE,
			face TEXT NOT NULL, issuedAt TEXT NOT NULL, withdrawnAt TEXT, withdrawnBy TEXT, withdrawnReason TEXT,
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, awardId), ${inSchool('awardId', 'awards')},
			${inSchool('personId', 'people')}, ${inSchool('withdrawnBy', 'people')},
			CHECK ((withdrawnAt IS NULL) = (withdrawnReason IS NULL)))`,
		`CREATE TRIGGER certificates_keep_their_face BEFORE UPDATE OF face, code, awardId, issuedAt ON certificates
			BEGIN SELECT RAISE(ABORT, 'what a certificate says is never changed'); END`,
		`CREATE TRIGGER certificates_stay BEFORE DELETE ON certificates
			BEGIN SELECT RAISE(ABORT, 'a certificate is withdrawn, never deleted'); END`
	]
};
