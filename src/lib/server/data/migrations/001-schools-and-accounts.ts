import { appendOnly, inSchool, schoolId } from './phrases';

/** Schools, the people in them, and how those people sign in. */
export const schoolsAndAccounts = {
	name: '001-schools-and-accounts',
	statements: [
		`CREATE TABLE schools (
			id TEXT PRIMARY KEY, slug TEXT NOT NULL UNIQUE, name TEXT NOT NULL, town TEXT NOT NULL,
			locale TEXT NOT NULL, timeZone TEXT NOT NULL, currency TEXT NOT NULL CHECK (length(currency) = 3),
			createdAt TEXT NOT NULL)`,
		`CREATE TABLE accounts (
			id TEXT PRIMARY KEY, email TEXT NOT NULL UNIQUE CHECK (email = lower(email)), name TEXT NOT NULL,
			passwordHash TEXT, emailVerifiedAt TEXT, createdAt TEXT NOT NULL)`,
		`CREATE TABLE sessions (
			id TEXT PRIMARY KEY, accountId TEXT NOT NULL REFERENCES accounts(id), tokenHash TEXT NOT NULL UNIQUE,
			device TEXT NOT NULL, address TEXT NOT NULL, createdAt TEXT NOT NULL, seenAt TEXT NOT NULL,
			expiresAt TEXT NOT NULL)`,
		`CREATE INDEX sessions_account ON sessions(accountId)`,
		`CREATE TABLE tokens (
			tokenHash TEXT PRIMARY KEY, purpose TEXT NOT NULL, identifier TEXT NOT NULL,
			createdAt TEXT NOT NULL, expiresAt TEXT NOT NULL)`,
		`CREATE INDEX tokens_identifier ON tokens(purpose, identifier)`,
		`CREATE TABLE known_devices (
			accountId TEXT NOT NULL REFERENCES accounts(id), deviceHash TEXT NOT NULL, seenAt TEXT NOT NULL,
			PRIMARY KEY (accountId, deviceHash))`,
		`CREATE TABLE sign_in_attempts (
			bucket TEXT PRIMARY KEY, failures INTEGER NOT NULL, lastAt TEXT NOT NULL, waitUntil TEXT)`,
		`CREATE TABLE people (
			${schoolId}, id TEXT NOT NULL, accountId TEXT NOT NULL REFERENCES accounts(id), name TEXT NOT NULL,
			studentNumber TEXT, extraTimePercent INTEGER NOT NULL DEFAULT 0 CHECK (extraTimePercent BETWEEN 0 AND 300),
			createdAt TEXT NOT NULL, PRIMARY KEY (schoolId, id), UNIQUE (schoolId, accountId))`,
		`CREATE INDEX people_account ON people(accountId)`,
		`CREATE TABLE person_roles (
			${schoolId}, personId TEXT NOT NULL,
			role TEXT NOT NULL CHECK (role IN ('student', 'instructor', 'verifier', 'admin')),
			givenAt TEXT NOT NULL, PRIMARY KEY (schoolId, personId, role), ${inSchool('personId', 'people')})`,
		`CREATE TABLE role_invitations (
			${schoolId}, id TEXT NOT NULL, email TEXT NOT NULL CHECK (email = lower(email)), name TEXT NOT NULL,
			roles TEXT NOT NULL, invitedBy TEXT NOT NULL, invitedAt TEXT NOT NULL, acceptedAt TEXT,
			PRIMARY KEY (schoolId, id), UNIQUE (schoolId, email), ${inSchool('invitedBy', 'people')})`,
		`CREATE TABLE api_tokens (
			${schoolId}, id TEXT NOT NULL, name TEXT NOT NULL, tokenHash TEXT NOT NULL UNIQUE, scopes TEXT NOT NULL,
			createdBy TEXT NOT NULL, createdAt TEXT NOT NULL, lastUsedAt TEXT, revokedAt TEXT,
			PRIMARY KEY (schoolId, id), ${inSchool('createdBy', 'people')})`,
		`CREATE TABLE request_keys (
			owner TEXT NOT NULL, requestKey TEXT NOT NULL, useCase TEXT NOT NULL, requestHash TEXT NOT NULL,
			answer TEXT, at TEXT NOT NULL, PRIMARY KEY (owner, requestKey))`,
		`CREATE INDEX request_keys_at ON request_keys(at)`,
		`CREATE TABLE ledger_entries (
			${schoolId}, number INTEGER NOT NULL CHECK (number >= 1), at TEXT NOT NULL, actorId TEXT NOT NULL,
			kind TEXT NOT NULL, subject TEXT NOT NULL, data TEXT NOT NULL, previousHash TEXT NOT NULL,
			hash TEXT NOT NULL, PRIMARY KEY (schoolId, number))`,
		...appendOnly('ledger_entries'),
		`CREATE TABLE jobs (
			id TEXT PRIMARY KEY, schoolId TEXT REFERENCES schools(id), kind TEXT NOT NULL, payload TEXT NOT NULL,
			state TEXT NOT NULL CHECK (state IN ('waiting', 'running', 'done', 'failed')), runAt TEXT NOT NULL,
			attempts INTEGER NOT NULL DEFAULT 0, startedAt TEXT, endedAt TEXT, fault TEXT)`,
		`CREATE INDEX jobs_due ON jobs(state, runAt)`,
		`CREATE TABLE mails (
			id TEXT PRIMARY KEY, schoolId TEXT REFERENCES schools(id), kind TEXT NOT NULL, recipient TEXT NOT NULL,
			payload TEXT NOT NULL, sealed TEXT, messageId TEXT NOT NULL UNIQUE,
			state TEXT NOT NULL CHECK (state IN ('waiting', 'sending', 'sent', 'unsure', 'refused', 'failed')),
			attempts INTEGER NOT NULL DEFAULT 0, createdAt TEXT NOT NULL, sentAt TEXT, fault TEXT)`,
		`CREATE INDEX mails_school ON mails(schoolId, createdAt)`
	]
};
