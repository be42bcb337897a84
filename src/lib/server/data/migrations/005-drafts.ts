import { inSchool, schoolId } from './phrases';

/** What is being written and is not published yet, kept as typed. `kind` is whatever can be drafted. */
export const drafts = {
	name: '005-drafts',
	statements: [
		`CREATE TABLE drafts (
			${schoolId}, id TEXT NOT NULL, kind TEXT NOT NULL, key TEXT NOT NULL, basedOnRevisionId TEXT,
			body TEXT NOT NULL, version INTEGER NOT NULL CHECK (version >= 1), createdAt TEXT NOT NULL,
			createdBy TEXT NOT NULL, updatedAt TEXT NOT NULL, updatedBy TEXT NOT NULL,
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, kind, key), ${inSchool('basedOnRevisionId', 'revisions')},
			${inSchool('createdBy', 'people')}, ${inSchool('updatedBy', 'people')})`
	]
};
