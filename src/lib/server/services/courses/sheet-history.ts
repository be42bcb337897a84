import { z } from 'zod';
import { changeWords } from '$lib/domain/data-sheets/change-words';
import { changesBetween } from '$lib/domain/data-sheets/changes';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { revisionsOf, type Revision } from '../../data/queries/publications';
import type { SchoolScope } from '../../data/scope';
import { readCase } from '../use-case';

async function revisionsHere({ scope, input }: { scope: SchoolScope; input: { key: string } }) {
	const revisions = await revisionsOf(scope, 'data-sheet', input.key);
	return revisions.length > 0 ? { schoolId: scope.schoolId, revisions } : undefined;
}
const sheetOf = (revision: Revision) => dataSheetSchema.parse(revision.body);

/** Every revision of a sheet, the newest first, with what changed at each. */
export const readSheetHistory = readCase({
	name: 'read-sheet-history',
	action: 'publication:read',
	input: z.object({ key: z.string() }),
	subject: revisionsHere,
	run({ subject: { revisions } }) {
		const [newest] = revisions;
		return Promise.resolve({
			key: newest?.key ?? '',
			code: newest ? sheetOf(newest).code : '',
			revisions: revisions.map((one, at) => {
				const earlier = revisions[at + 1];
				const sheet = sheetOf(one);
				return {
					revision: sheet.revision,
					issuedOn: sheet.issuedOn,
					drawnBy: sheet.drawnBy,
					publishedAt: one.publishedAt,
					changes: earlier ? changesBetween(sheetOf(earlier), sheet).map(changeWords) : null
				};
			})
		});
	}
});

/** One revision by its letter, whether or not it still stands. */
export const readSheetRevision = readCase({
	name: 'read-sheet-revision',
	action: 'publication:read',
	input: z.object({ key: z.string(), revision: z.string() }),
	async subject(work) {
		const found = await revisionsHere(work);
		const sheets = found?.revisions.map(sheetOf) ?? [];
		const sheet = sheets.find((one) => one.revision === work.input.revision.toUpperCase());
		return sheet && { schoolId: work.scope.schoolId, sheet, newest: sheets[0]?.revision ?? '' };
	},
	run: ({ subject: { sheet, newest } }) => Promise.resolve({ sheet, newest })
});
