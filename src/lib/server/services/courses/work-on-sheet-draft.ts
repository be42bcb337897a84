import { z } from 'zod';
import { sheetDraftSchema, type SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import { applyToDraft, draftOperationSchema } from '$lib/domain/data-sheets/draft/operation';
import { Problem } from '$lib/domain/problem';
import { findDraft, removeDraft, saveDraft, type DraftRow } from '../../data/queries/drafts';
import { findPerson } from '../../data/queries/schools';
import type { SchoolScope } from '../../data/scope';
import { writeCase } from '../use-case';
import { sheetText } from './begin-sheet-draft';
import { readSheetFile } from './sheet-file';

const baseVersion = z.coerce.number().int().min(1);

async function subject({ scope, input }: { scope: SchoolScope; input: { key: string } }) {
	const draft = await findDraft(scope, 'data-sheet', input.key);
	return draft && { schoolId: scope.schoolId, draft };
}

/**
 * Takes what is typed, each batch on top of a version that the page names. Where somebody else
 * was faster both sides are sent back to be shown; nothing is overwritten.
 */
export const workOnSheetDraft = writeCase({
	name: 'work-on-sheet-draft',
	action: 'data-sheet:edit',
	input: z.object({
		key: z.string(),
		baseVersion,
		operations: z.array(draftOperationSchema).min(1).max(200)
	}),
	subject,
	async run({ scope, subject: { draft }, input, me, at }) {
		await demandVersion(scope, draft, input.baseVersion);
		const body = input.operations.reduce(applyToDraft, draft.body as SheetDraft);
		return { version: await save(scope, draft, body, me, at) };
	}
});

/** Puts what a file says in the place of all that stands in the draft. */
export const readFileIntoDraft = writeCase({
	name: 'read-file-into-draft',
	action: 'data-sheet:edit',
	input: z.object({ key: z.string(), baseVersion, text: sheetText }),
	subject,
	async run({ scope, subject: { draft }, input, me, at }) {
		await demandVersion(scope, draft, input.baseVersion);
		const { draft: body, leftOut } = readSheetFile(input.text);
		return { version: await save(scope, draft, body, me, at), leftOut };
	}
});

export const discardSheetDraft = writeCase({
	name: 'discard-sheet-draft',
	action: 'data-sheet:edit',
	input: z.object({ key: z.string(), baseVersion }),
	subject,
	async run({ scope, subject: { draft }, input, record }) {
		await demandVersion(scope, draft, input.baseVersion);
		await removeDraft(scope, draft.id);
		const data = { version: draft.version };
		await record({ kind: 'data-sheet-draft-discarded', subject: input.key, data });
		return { isPublished: draft.basedOnRevisionId !== null };
	}
});

async function save(scope: SchoolScope, draft: DraftRow, body: SheetDraft, me: string, at: Date) {
	const fits = sheetDraftSchema.safeParse(body);
	if (!fits.success) throw new Problem('input', 'There is more in it than a data sheet can hold.');
	const version = await saveDraft(scope, draft, fits.data, me, at.toISOString());
	if (version === undefined)
		throw new Problem('conflict', 'Somebody was faster. Load the page again.');
	return version;
}

/** @throws with the other side, for the page to show */
export async function demandVersion(scope: SchoolScope, draft: DraftRow, named: number) {
	if (draft.version === named) return;
	const other = await findPerson(scope, draft.updatedBy);
	throw new Problem(
		'stale',
		'This draft was changed by {name} meanwhile. Look at both and choose.',
		{ name: other?.name ?? 'somebody' },
		{},
		{ version: draft.version, body: draft.body, by: other?.name ?? '' }
	);
}
