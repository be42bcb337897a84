import { commonTable, instant, integer, json, key, nullable, schoolTable, text } from '../table';

export const ledgerEntries = schoolTable('ledger_entries', {
	number: { ...integer(), key: true },
	at: instant(),
	actorId: text(),
	kind: text(),
	subject: text(),
	data: json<Record<string, unknown>>(),
	previousHash: text(),
	hash: text()
});

export type JobState = 'waiting' | 'running' | 'done' | 'failed';

/** What must happen outside, later: written in the transaction that wants it. */
export const jobs = commonTable('jobs', {
	id: key(),
	schoolId: nullable(text()),
	kind: text(),
	payload: json<Record<string, unknown>>(),
	state: text<JobState>(),
	runAt: instant(),
	attempts: integer(),
	startedAt: nullable(instant()),
	endedAt: nullable(instant()),
	fault: nullable(text())
});

export type MailState = 'waiting' | 'sending' | 'sent' | 'unsure' | 'refused' | 'failed';

export const mails = commonTable('mails', {
	id: key(),
	schoolId: nullable(text()),
	kind: text(),
	recipient: text(),
	payload: json<Record<string, unknown>>(),
	/** One-time links, sealed with the server's key and wiped once sent: no page can show them. */
	sealed: nullable(text()),
	messageId: text(),
	state: text<MailState>(),
	attempts: integer(),
	createdAt: instant(),
	sentAt: nullable(instant()),
	fault: nullable(text())
});
