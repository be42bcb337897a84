import { z } from 'zod';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { Problem } from '$lib/domain/problem';
import { withoutOrders } from '$lib/domain/data-sheets/without-orders';
import { newestRevision, newestRevisions } from '../../data/queries/publications';
import { allSchools, schoolById } from '../../data/queries/schools';
import { openSittingOf } from '../../data/queries/sittings';
import { within, type SchoolScope } from '../../data/scope';
import { readCase } from '../use-case';
import { sheetAsFile, sheetFileKinds } from './sheet-as-file';

/** Every data sheet that a school shows to anybody. */
export const listPublicSheets = readCase({
	name: 'list-public-sheets',
	action: 'data-sheet:read-public',
	where: 'common',
	input: z.object({}).default({}),
	subject: () => Promise.resolve({}),
	async run({ scope }) {
		const bySchool = await Promise.all(
			(await allSchools(scope)).map(async ({ id, slug, name }) =>
				(await newestRevisions(within(scope, id), 'data-sheet'))
					.map((one) => dataSheetSchema.parse(one.body))
					.filter((one) => one.public)
					.map(({ key, code, title, revision, issuedOn, dimensions, fasteners }) => ({
						school: name,
						key,
						code,
						title,
						revision,
						issuedOn,
						values: dimensions.length + fasteners.length,
						href: `/data-sheets/${slug}/${key}`
					}))
			)
		);
		return { sheets: bySchool.flat() };
	}
});

/** What is not public is not there, for anybody: nobody is asked to sign in for it. */
async function publicSheet(scope: SchoolScope, key: string) {
	const revision = await newestRevision(scope, 'data-sheet', key);
	const sheet = revision && dataSheetSchema.parse(revision.body);
	if (!revision || !sheet?.public)
		throw new Problem('absent', 'There is no public data sheet at this address.');
	return { sheet, hash: revision.hash, publishedAt: revision.publishedAt };
}

/** One of them. A sheet that is not public is not there; orders are not shown to who sits a quiz. */
export const readPublicSheet = readCase({
	name: 'read-public-sheet',
	action: 'data-sheet:read-public',
	input: z.object({ key: z.string() }),
	subject: () => Promise.resolve({}),
	async run({ scope, me, input }) {
		const { sheet, publishedAt } = await publicSheet(scope, input.key);
		const [school, sitting] = await Promise.all([
			schoolById(scope, scope.schoolId),
			openSittingOf(scope, me)
		]);
		return {
			school: school?.name ?? '',
			sheet: sitting ? withoutOrders(sheet) : sheet,
			hideOrders: sitting !== undefined,
			publishedAt
		};
	}
});

/** A public sheet as a file that anybody may keep, with what tells one state of it from another. */
export const exportPublicSheet = readCase({
	name: 'export-public-sheet',
	action: 'data-sheet:read-public',
	input: z.object({ key: z.string(), as: z.enum(sheetFileKinds) }),
	subject: () => Promise.resolve({}),
	async run({ scope, input }) {
		const { sheet, hash } = await publicSheet(scope, input.key);
		return { ...sheetAsFile(sheet, input.as), hash };
	}
});
