import { z } from 'zod';
import { inputProblem, Problem } from '$lib/domain/problem';
import { removeDraft } from '../../data/queries/drafts';
import { revisionsOf } from '../../data/queries/publications';
import { schoolScope, type SchoolScope } from '../../data/scope';
import type { House } from '../house';
import { readCase, writeCase } from '../use-case';
import { dataSheetThing, lessonThing, publishAll } from './publish-course';
import { draftAndStanding } from './read-sheet-draft';
import { reviewSheet } from './review-sheet';
import { demandVersion } from './work-on-sheet-draft';

/** What is seen before a draft is published. */
export const reviewSheetDraft = readCase({
	name: 'review-sheet-draft',
	action: 'data-sheet:publish',
	input: z.object({ key: z.string() }),
	subject: ({ scope, input }) => draftHere(scope, input.key),
	async run({ scope, subject: { draft, standing }, input: { key }, at }) {
		const [review, revisions] = await Promise.all([
			reviewSheet(scope, { key, draft, standing, at }),
			revisionsOf(scope, 'data-sheet', key)
		]);
		const letterOf = (number: number) => {
			const found = revisions.find((one) => one.number === number);
			return (found?.body as { revision?: string } | undefined)?.revision ?? '';
		};
		const { sittings, attempts, sheet, ...rest } = review;
		return {
			...rest,
			key,
			schoolId: scope.schoolId,
			version: draft.version,
			code: sheet?.code ?? key,
			isReadable: sheet !== undefined,
			before: rest.before && { code: rest.before.code, revision: rest.before.revision },
			sittings: sittings.map((one) => ({ ...one, letter: letterOf(one.sheetNumber) })),
			attempts: attempts.map((one) => ({ ...one, letter: letterOf(one.sheetNumber) }))
		};
	}
});

/**
 * Publishes a draft as the sheet's next revision, and the lessons that its changes touch as new
 * revisions with it. What was begun on an older revision stays on it.
 */
export const publishSheet = writeCase({
	name: 'publish-sheet',
	action: 'data-sheet:publish',
	input: z.object({
		key: z.string(),
		schoolId: z.string(),
		baseVersion: z.coerce.number().int().min(1),
		/** The warnings that were ticked as read, word for word. */
		read: z.array(z.string()).default([])
	}),
	async prepare({ house, input, at }) {
		const scope = schoolScope(house.database, input.schoolId, null);
		const found = await draftHere(scope, input.key);
		if (!found) return undefined;
		const review = await reviewSheet(scope, { key: input.key, at, ...found });
		if (!review.sheet || review.refused.length > 0) return undefined;
		const lessonKeys = review.touched.filter((one) => one.kind === 'lesson').map((one) => one.key);
		const { draft, standing } = found;
		return {
			version: draft.version,
			standingId: standing?.id,
			sheet: review.sheet,
			lessons: await renderLessons(house, lessonKeys, review.sheet)
		};
	},
	subject: async ({ scope, input }) =>
		input.schoolId === scope.schoolId ? draftHere(scope, input.key) : undefined,
	async run({ scope, subject: { draft, standing }, input, prepared, at, newId, record }) {
		const { key } = input;
		await demandVersion(scope, draft, input.baseVersion);
		const review = await reviewSheet(scope, { key, draft, standing, at });
		if (!review.sheet) throw inputProblem({ refused: ['Some of it cannot be read yet.'] });
		const unread = review.warnings.filter((one) => !input.read.includes(one));
		if (review.refused.length > 0) throw inputProblem({ refused: review.refused });
		if (unread.length > 0) throw inputProblem({ read: ['Read each of these, and tick it.'] });
		if (prepared?.version !== draft.version || prepared.standingId !== standing?.id)
			throw new Problem('conflict', 'Somebody was faster. Load the page again.');
		const things = [dataSheetThing(prepared.sheet), ...prepared.lessons];
		const made = await publishAll(scope, things, newId, at.toISOString());
		await removeDraft(scope, draft.id);
		const { revision } = prepared.sheet;
		const data = { revision, revisions: made.map((one) => one.revisionId) };
		await record({ kind: 'data-sheet-published', subject: key, data });
		return { revision, lessons: made.filter((one) => one.kind === 'lesson').length };
	}
});

async function draftHere(scope: SchoolScope, key: string) {
	const found = await draftAndStanding(scope, key);
	return found?.draft && { schoolId: scope.schoolId, ...found, draft: found.draft };
}

function renderLessons(
	house: House,
	keys: readonly string[],
	sheet: Parameters<typeof lessonThing>[1]
) {
	const lessons = keys
		.map((key) => house.catalogue.lessonByKey(key))
		.filter((one) => one !== undefined);
	return Promise.all(lessons.map((one) => lessonThing(one, sheet)));
}
