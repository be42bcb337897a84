import { missingFrom } from '$lib/domain/job-sheets/complete';
import { tagQrText, tagWords } from '$lib/domain/job-sheets/evidence-tag';
import { resultsOf } from '$lib/domain/job-sheets/results';
import type { photographs, submissions } from '../models';
import type { SchoolScope } from '../scope';
import type { RowOf } from '../table';
import { revisionsOfAttempt } from './attempt-context';
import { findPerson } from './schools';
import { markOf, photographsOf } from './submissions';

/** A photograph as a page may know it: never its place in the store. */
export function photographFace(one: RowOf<typeof photographs>) {
	return {
		id: one.id,
		shotKey: one.shotKey,
		state: one.state,
		fault: one.fault,
		tagFound: one.tagFound,
		sha256: one.originalSha256,
		smallFileId: one.smallFileId,
		mediumFileId: one.mediumFileId,
		largeFileId: one.largeFileId
	};
}

/** One attempt with all that follows from it. */
export async function attemptFace(scope: SchoolScope, attempt: RowOf<typeof submissions>) {
	const [{ jobSheet, jobSheetNumber, sheet }, rows, mark] = await Promise.all([
		revisionsOfAttempt(scope, attempt),
		photographsOf(scope, attempt.id),
		markOf(scope, attempt.id)
	]);
	const marker = mark && (await findPerson(scope, mark.markerId));
	return {
		id: attempt.id,
		attempt: attempt.attempt,
		state: attempt.state,
		version: attempt.version,
		body: attempt.body,
		openedAt: attempt.openedAt,
		handedInAt: attempt.handedInAt,
		decision: attempt.decision,
		decidedAt: attempt.decidedAt,
		tag: {
			code: attempt.tagCode,
			words: tagWords(attempt.tagCode),
			qrText: tagQrText(attempt.tagCode)
		},
		jobSheet,
		jobSheetNumber,
		sheet,
		photographs: rows.map(photographFace),
		results: resultsOf(jobSheet, sheet, attempt.body.readings),
		missing: missingFrom(jobSheet, attempt.body, rows),
		mark: mark && {
			rows: mark.rows,
			words: mark.words,
			decision: mark.decision,
			because: mark.because,
			redo: mark.redo,
			signedAt: mark.signedAt,
			markerName: marker?.name ?? ''
		}
	};
}
