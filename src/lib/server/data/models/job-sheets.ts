import { instant, integer, json, key, nullable, schoolTable, text } from '../table';
import type { SubmissionBody } from '$lib/domain/job-sheets/submission';
import type { MarkRow } from '$lib/domain/marking/mark';

export type SubmissionState = 'open' | 'handed-in' | 'decided' | 'void';

export const submissions = schoolTable('submissions', {
	id: key(),
	enrolmentId: text(),
	personId: text(),
	stepKey: text(),
	jobSheetId: text(),
	jobSheetRevisionId: text(),
	sheetRevisionId: text(),
	attempt: integer(),
	state: text<SubmissionState>(),
	tagCode: text(),
	/** Grows by one with each accepted operation: what a browser names as its base. */
	version: integer(),
	body: json<SubmissionBody>(),
	openedAt: instant(),
	handedInAt: nullable(instant()),
	decidedAt: nullable(instant()),
	decision: nullable(text<'competent' | 'not-yet'>())
});

export const files = schoolTable('files', {
	id: key(),
	sha256: text(),
	mediaType: text(),
	bytes: integer(),
	/** What it is of: only a photograph's clean copies are ever shown, its original is kept. */
	role: text<'original' | 'copy' | 'certificate'>(),
	widthPx: nullable(integer()),
	heightPx: nullable(integer()),
	createdAt: instant()
});

export type PhotographState = 'received' | 'ready' | 'refused';

export const photographs = schoolTable('photographs', {
	id: key(),
	submissionId: text(),
	shotKey: text(),
	originalFileId: text(),
	originalSha256: text(),
	smallFileId: nullable(text()),
	mediumFileId: nullable(text()),
	largeFileId: nullable(text()),
	state: text<PhotographState>(),
	fault: nullable(text()),
	/** What the evidence tag in it says: found (this attempt's), other, or none. */
	tagFound: nullable(text<'this-attempt' | 'another' | 'none'>()),
	/** A fingerprint that stays nearly the same when a picture is saved again. */
	likeness: nullable(text()),
	takenInAt: instant(),
	removedAt: nullable(instant())
});

export const markingLeases = schoolTable('marking_leases', {
	submissionId: key(),
	markerId: text(),
	untilAt: instant()
});

/** A signed mark: never overwritten. */
export const marks = schoolTable('marks', {
	id: key(),
	submissionId: text(),
	markerId: text(),
	rows: json<MarkRow[]>(),
	words: text(),
	decision: text<'competent' | 'not-yet'>(),
	because: json<string[]>(),
	redo: json<string[]>(),
	signedAt: instant()
});
