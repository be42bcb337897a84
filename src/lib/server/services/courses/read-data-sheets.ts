import { z } from 'zod';
import { may } from '$lib/domain/access/policy';
import { withoutOrders } from '$lib/domain/data-sheets/without-orders';
import type { SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import { dimensionsReadSoFar } from '$lib/domain/data-sheets/draft/read-draft';
import { lacksFor } from '$lib/domain/data-sheets/lacks';
import { dataSheetSchema, type DataSheet } from '$lib/domain/data-sheets/schema';
import type { JobSheet } from '$lib/domain/job-sheets/schema';
import { draftsOf, findDraft } from '../../data/queries/drafts';
import { newestRevision, newestRevisions } from '../../data/queries/publications';
import { openSittingOf } from '../../data/queries/sittings';
import type { SchoolScope } from '../../data/scope';
import { readCase } from '../use-case';
import { sheetAsFile, sheetFileKinds } from './sheet-as-file';

/** The school's data sheets; whoever may edit them sees the drafts beside. */
export const listDataSheets = readCase({
	name: 'list-data-sheets',
	action: 'lesson:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope, actor }) {
		const mayEdit = may(actor, 'data-sheet:edit', { schoolId: scope.schoolId });
		const [sheets, drafts, jobSheets] = await Promise.all([
			newestRevisions(scope, 'data-sheet'),
			mayEdit ? draftsOf(scope, 'data-sheet') : [],
			mayEdit ? newestRevisions(scope, 'job-sheet') : []
		]);
		const draftOf = (key: string) => {
			const draft = drafts.find((one) => one.key === key);
			return draft ? { updatedAt: draft.updatedAt, updatedBy: draft.updatedByName } : null;
		};
		const lacksOf = (sheet: Pick<DataSheet, 'dimensions'>) =>
			jobSheets
				.map((one) => one.body as JobSheet)
				.map((one) => ({ jobSheet: one.title, lacks: lacksFor(sheet, one) }));
		return {
			mayEdit,
			sheets: sheets.map(({ key, body, publishedAt }) => {
				const sheet = dataSheetSchema.parse(body);
				const { code, title, revision, issuedOn } = sheet;
				return {
					key,
					code,
					title,
					revision,
					issuedOn,
					isPublic: sheet.public,
					publishedAt,
					draft: draftOf(key),
					lacks: lacksOf(sheet)
				};
			}),
			/** Begun and never published. */
			begun: drafts
				.filter((draft) => !sheets.some((one) => one.key === draft.key))
				.map((draft) => {
					const body = draft.body as SheetDraft;
					const { code = '', title = '' } = body.head;
					const lacks = lacksOf({ dimensions: dimensionsReadSoFar(body) });
					return { key: draft.key, code, title, draft: draftOf(draft.key), lacks };
				})
		};
	}
});

/** One sheet as it stands. While a quiz is open for somebody, the printed orders are not shown. */
export const readDataSheet = readCase({
	name: 'read-data-sheet',
	action: 'lesson:read',
	input: z.object({ key: z.string() }),
	async subject({ scope, input }) {
		const revision = await newestRevision(scope, 'data-sheet', input.key);
		return revision && { schoolId: scope.schoolId, revision };
	},
	async run({ scope, me, actor, input, subject: { revision } }) {
		const mayEdit = may(actor, 'data-sheet:edit', { schoolId: scope.schoolId });
		const [hideOrders, draft] = await Promise.all([
			isSitting(scope, me),
			mayEdit ? findDraft(scope, 'data-sheet', input.key) : undefined
		]);
		const sheet = dataSheetSchema.parse(revision.body);
		return {
			sheet: hideOrders ? withoutOrders(sheet) : sheet,
			publishedAt: revision.publishedAt,
			hideOrders,
			mayEdit,
			mayReadHistory: may(actor, 'publication:read', { schoolId: scope.schoolId }),
			draft: draft ? { updatedAt: draft.updatedAt } : null
		};
	}
});

/** The sheet as it stands, as a file. */
export const exportDataSheet = readCase({
	name: 'export-data-sheet',
	action: 'lesson:read',
	input: z.object({ key: z.string(), as: z.enum(sheetFileKinds) }),
	async subject({ scope, input }) {
		const revision = await newestRevision(scope, 'data-sheet', input.key);
		return revision && { schoolId: scope.schoolId, revision };
	},
	async run({ scope, me, input, subject: { revision } }) {
		const sheet = dataSheetSchema.parse(revision.body);
		return sheetAsFile((await isSitting(scope, me)) ? withoutOrders(sheet) : sheet, input.as);
	}
});

/** A printed order would answer a question that asks for it. */
async function isSitting(scope: SchoolScope, me: string): Promise<boolean> {
	return (await openSittingOf(scope, me)) !== undefined;
}
