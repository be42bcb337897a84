import { instant, json, key, nullable, schoolTable, text } from '../table';
import type { CertificateFace } from '$lib/domain/certificates/face';

export type AwardState = 'waiting' | 'awarded' | 'declined';

export const awards = schoolTable('awards', {
	id: key(),
	enrolmentId: text(),
	state: text<AwardState>(),
	rule: text(),
	evidence: json<unknown>(),
	because: json<string[]>(),
	proposedAt: instant(),
	decidedBy: nullable(text()),
	decidedAt: nullable(instant()),
	reason: nullable(text())
});

export const certificates = schoolTable('certificates', {
	id: key(),
	awardId: text(),
	personId: text(),
	code: text(),
	face: json<CertificateFace>(),
	issuedAt: instant(),
	withdrawnAt: nullable(instant()),
	withdrawnBy: nullable(text()),
	withdrawnReason: nullable(text())
});
