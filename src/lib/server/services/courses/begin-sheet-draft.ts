import { z } from 'zod';
import { draftFrom, sheetDraftSchema, type SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { inputProblem } from '$lib/domain/problem';
import { beginDraft, findDraft } from '../../data/queries/drafts';
import { newestRevision } from '../../data/queries/publications';
import { findPerson } from '../../data/queries/schools';
import type { SchoolScope } from '../../data/scope';
import type { House } from '../house';
import { writeCase } from '../use-case';
import { readSheetFile } from './sheet-file';

/** "kt 900" is typed for KT-900. */
const code = z
	.string()
	.transform((typed) => typed.trim().toUpperCase().replace(/\s+/g, '-'))
	.pipe(dataSheetSchema.shape.code.max(40));
export const sheetText = z.string().min(1, 'Choose a file or paste its text.').max(400_000);
const school = ({ scope }: { scope: SchoolScope }) => Promise.resolve({ schoolId: scope.schoolId });

/** Opens the draft of a published sheet, or begins one from its newest revision. */
export const beginSheetDraft = writeCase({
	name: 'begin-sheet-draft',
	action: 'data-sheet:edit',
	input: z.object({ key: z.string() }),
	async subject({ scope, input }) {
		const standing = await newestRevision(scope, 'data-sheet', input.key);
		return standing && { schoolId: scope.schoolId, standing };
	},
	async run({ scope, subject: { standing }, input: { key }, me, at, newId }) {
		if (await findDraft(scope, 'data-sheet', key)) return { key };
		const body = draftFrom(dataSheetSchema.parse(standing.body)).draft;
		const draft = { id: newId(), kind: 'data-sheet' as const, key, body };
		await beginDraft(scope, { ...draft, basedOnRevisionId: standing.id }, me, at.toISOString());
		return { key };
	}
});

/** A sheet for an engine of the school's own: a code and a title, then values one by one. */
export const beginNewSheet = writeCase({
	name: 'begin-new-sheet',
	action: 'data-sheet:edit',
	input: z.object({ code, title: dataSheetSchema.shape.title }),
	subject: school,
	async run({ scope, house, input, me, at, newId }) {
		const key = await freeKey(scope, house, input.code, 'code');
		const drawnBy = (await findPerson(scope, me))?.name ?? '';
		const { draft } = draftFrom({ ...input, drawnBy });
		await beginNew(scope, { id: newId(), key, body: draft }, me, at);
		return { key };
	}
});

/** A new sheet as a file says it, faults and all. */
export const beginSheetFromFile = writeCase({
	name: 'begin-sheet-from-file',
	action: 'data-sheet:edit',
	input: z.object({ text: sheetText }),
	subject: school,
	async run({ scope, house, input, me, at, newId }) {
		const { written, draft, leftOut } = readSheetFile(input.text);
		const read = code.safeParse(written.code);
		if (!read.success) throw inputProblem({ text: ['The file says no code that can be used.'] });
		const key = await freeKey(scope, house, read.data, 'text');
		await beginNew(scope, { id: newId(), key, body: sheetDraftSchema.parse(draft) }, me, at);
		return { key, leftOut };
	}
});

function beginNew(
	scope: SchoolScope,
	draft: { id: string; key: string; body: SheetDraft },
	me: string,
	at: Date
) {
	const row = { ...draft, kind: 'data-sheet' as const, basedOnRevisionId: null };
	return beginDraft(scope, row, me, at.toISOString());
}

/** The key that a code gives, where nothing of the school or of a course stands under it. */
async function freeKey(
	scope: SchoolScope,
	house: House,
	typed: string,
	field: string
): Promise<string> {
	const key = typed.toLowerCase();
	if (house.catalogue.engines.some((one) => one.key === key))
		throw inputProblem({ [field]: [`${typed} comes with a course: the office takes it.`] });
	const taken =
		(await newestRevision(scope, 'data-sheet', key)) ?? (await findDraft(scope, 'data-sheet', key));
	if (taken)
		throw inputProblem({ [field]: [`There is a sheet ${typed} already. Open its draft instead.`] });
	return key;
}
