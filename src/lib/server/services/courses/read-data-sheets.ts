import { z } from 'zod';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { newestRevision, newestRevisions } from '../../data/queries/publications';
import { readCase } from '../use-case';

export const listDataSheets = readCase({
	name: 'list-data-sheets',
	action: 'lesson:read',
	input: z.object({}).default({}),
	subject: ({ scope }) => Promise.resolve({ schoolId: scope.schoolId }),
	async run({ scope }) {
		const sheets = await newestRevisions(scope, 'data-sheet');
		return { sheets: sheets.map(({ key, title, publishedAt }) => ({ key, title, publishedAt })) };
	}
});

export const readDataSheet = readCase({
	name: 'read-data-sheet',
	action: 'lesson:read',
	input: z.object({ key: z.string() }),
	async subject({ scope, input }) {
		const revision = await newestRevision(scope, 'data-sheet', input.key);
		return revision && { schoolId: scope.schoolId, revision };
	},
	run: ({ subject: { revision } }) =>
		Promise.resolve({
			sheet: dataSheetSchema.parse(revision.body),
			publishedAt: revision.publishedAt
		})
});
