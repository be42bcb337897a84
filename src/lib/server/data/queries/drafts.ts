import { drafts, people, type DraftKind } from '../models';
import { find, insert, remove, select, update } from '../rows';
import type { SchoolScope } from '../scope';
import type { RowOf } from '../table';

export type DraftRow = RowOf<typeof drafts>;
type NewDraft = Pick<DraftRow, 'id' | 'kind' | 'key' | 'basedOnRevisionId' | 'body'>;

export function findDraft(scope: SchoolScope, kind: DraftKind, key: string) {
	return find(scope, drafts, { kind, key });
}

/** Every draft of a kind, with the name of who wrote in it last. */
export async function draftsOf(scope: SchoolScope, kind: DraftKind) {
	const rows = await select(scope, drafts, { kind }, { order: [['key', 'asc']] });
	if (rows.length === 0) return [];
	const writers = await select(scope, people, { id: rows.map((one) => one.updatedBy) });
	return rows.map((row) => ({
		...row,
		updatedByName: writers.find((one) => one.id === row.updatedBy)?.name ?? ''
	}));
}

export async function beginDraft(scope: SchoolScope, draft: NewDraft, me: string, at: string) {
	const written = { createdAt: at, createdBy: me, updatedAt: at, updatedBy: me };
	await insert(scope, drafts, { ...draft, version: 1, ...written });
}

/** @returns the new version, or undefined where somebody saved over the version that was named */
export async function saveDraft(
	scope: SchoolScope,
	draft: Pick<DraftRow, 'id' | 'version'>,
	body: unknown,
	me: string,
	at: string
): Promise<number | undefined> {
	const { id, version } = draft;
	const change = { body, version: version + 1, updatedAt: at, updatedBy: me };
	const changed = await update(scope, drafts, { id, version }, change);
	return changed === 1 ? version + 1 : undefined;
}

export async function removeDraft(scope: SchoolScope, id: string): Promise<void> {
	await remove(scope, drafts, { id });
}
