import { z } from 'zod';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { withoutOrders } from '$lib/domain/data-sheets/without-orders';
import { newestRevision, newestRevisions } from '../../data/queries/publications';
import { allSchools, schoolById } from '../../data/queries/schools';
import { openSittingOf } from '../../data/queries/sittings';
import { within } from '../../data/scope';
import { readCase } from '../use-case';

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

/** One of them. A sheet that is not public is not there; orders are not shown to who sits a quiz. */
export const readPublicSheet = readCase({
	name: 'read-public-sheet',
	action: 'data-sheet:read-public',
	input: z.object({ key: z.string() }),
	async subject({ scope, input }) {
		const revision = await newestRevision(scope, 'data-sheet', input.key);
		const sheet = revision && dataSheetSchema.parse(revision.body);
		return sheet?.public ? { schoolId: scope.schoolId, revision, sheet } : undefined;
	},
	async run({ scope, me, subject: { revision, sheet } }) {
		const [school, sitting] = await Promise.all([
			schoolById(scope, scope.schoolId),
			openSittingOf(scope, me)
		]);
		return {
			school: school?.name ?? '',
			sheet: sitting ? withoutOrders(sheet) : sheet,
			hideOrders: sitting !== undefined,
			publishedAt: revision.publishedAt
		};
	}
});
