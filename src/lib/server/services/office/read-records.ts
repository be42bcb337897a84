import { z } from 'zod';
import { chainFault, fileLine } from '$lib/domain/ledger/entry';
import { hashOf, readLedger } from '../../data/queries/ledger';
import { mailsOfSchool } from '../../data/queries/mails';
import { schoolById } from '../../data/queries/schools';
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

/** The whole ledger as a file to take away, oldest entry first. */
export const exportLedger = readCase({
	name: 'export-ledger',
	action: 'ledger:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope }) {
		const [entries, school] = await Promise.all([
			readLedger(scope),
			schoolById(scope, scope.schoolId)
		]);
		const last = entries.at(-1)?.number ?? 0;
		const fileName = `ledger-${school?.slug ?? 'school'}-${last}.jsonl`;
		return { fileName, text: entries.map(fileLine).join('') };
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
