import { z } from 'zod';
import { chainFault } from '$lib/domain/ledger/entry';
import { hashOf, readLedger } from '../../data/queries/ledger';
import { mailsOfSchool } from '../../data/queries/mails';
import { readCase } from '../use-case';

const pageLength = 50;

/** The ledger, newest first, and whether its chain holds from the first entry to the last. */
export const readLedgerPage = readCase({
	name: 'read-ledger-page',
	action: 'ledger:read',
	input: z.object({ before: z.coerce.number().int().min(1).optional() }),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, input }) {
		const [page, all] = await Promise.all([
			readLedger(scope, { limit: pageLength, before: input.before }),
			readLedger(scope)
		]);
		return {
			entries: page.map(({ number, at, actorId, kind, subject, data, hash }) => ({
				number,
				at,
				actorId,
				kind,
				subject,
				data,
				hash
			})),
			total: all.length,
			fault: chainFault(all, hashOf) ?? null
		};
	}
});

/** What was mailed for the school and how it stands. One-time links are not among it. */
export const readMails = readCase({
	name: 'read-mails',
	action: 'mail:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope }) {
		const rows = await mailsOfSchool(scope, scope.schoolId);
		return {
			mails: rows.map(({ id, kind, recipient, state, attempts, createdAt, sentAt, fault }) => ({
				id,
				kind,
				recipient,
				state,
				attempts,
				createdAt,
				sentAt,
				fault
			}))
		};
	}
});
