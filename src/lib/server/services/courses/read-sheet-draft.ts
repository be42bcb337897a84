import { z } from 'zod';
import type { SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import { stampFor } from '$lib/domain/data-sheets/draft/stamp';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { usesOf } from '$lib/domain/data-sheets/uses';
import type { JobSheet } from '$lib/domain/job-sheets/schema';
import { findDraft } from '../../data/queries/drafts';
import { newestRevision, newestRevisions } from '../../data/queries/publications';
import { findPerson, schoolById } from '../../data/queries/schools';
import { taughtFrom } from '../../data/queries/sheet-usage';
import type { SchoolScope } from '../../data/scope';
import { readCase } from '../use-case';

/** What an editor of a sheet stands on: its draft, what is published, and who uses its values. */
export const readSheetDraft = readCase({
	name: 'read-sheet-draft',
	action: 'data-sheet:edit',
	input: z.object({ key: z.string() }),
	async subject({ scope, input }) {
		const found = await draftAndStanding(scope, input.key);
		return found && { schoolId: scope.schoolId, ...found };
	},
	async run({ scope, input: { key }, subject: { draft, standing }, at }) {
		const [school, taught, jobSheets, writer] = await Promise.all([
			schoolById(scope, scope.schoolId),
			taughtFrom(scope, key),
			newestRevisions(scope, 'job-sheet'),
			draft && findPerson(scope, draft.updatedBy)
		]);
		const sheet = standing && dataSheetSchema.parse(standing.body);
		return {
			key,
			stamp: stampFor(key, sheet?.revision, at, school?.timeZone ?? 'UTC'),
			standing: sheet ?? null,
			draft: draft
				? {
						id: draft.id,
						version: draft.version,
						body: draft.body as SheetDraft,
						createdAt: draft.createdAt,
						updatedAt: draft.updatedAt,
						updatedBy: writer?.name ?? ''
					}
				: null,
			uses: usesOf(taught),
			/** Every job sheet of the school: what the sheet would need for each. */
			jobSheets: jobSheets.map((one) => one.body as JobSheet)
		};
	}
});

/** @returns nothing where the school has neither a draft nor a sheet under this key */
export async function draftAndStanding(scope: SchoolScope, key: string) {
	const [draft, standing] = await Promise.all([
		findDraft(scope, 'data-sheet', key),
		newestRevision(scope, 'data-sheet', key)
	]);
	return draft || standing ? { draft, standing } : undefined;
}
