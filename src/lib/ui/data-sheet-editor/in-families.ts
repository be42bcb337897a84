import type { DraftRow, SheetDraft } from '$lib/domain/data-sheets/draft/draft';

export type FamilyRows = { key: string; words: string; rows: readonly DraftRow[] };

/** Rows under the part families that their keys name; those of none come last. */
export function inFamilies(draft: SheetDraft, rows: readonly DraftRow[]): FamilyRows[] {
	const familyOf = (row: DraftRow) => row.values.key?.trim().split('.')[0] ?? '';
	const families = draft.rows.partFamilies
		.map(({ values }) => ({ key: values.key?.trim() ?? '', words: values.words?.trim() ?? '' }))
		.filter((one, i, all) => all.findIndex((other) => other.key === one.key) === i);
	const rest = rows.filter((row) => !families.some((one) => one.key === familyOf(row)));
	return [
		...families.map(({ key, words }) => ({
			key,
			words: words || key,
			rows: rows.filter((row) => familyOf(row) === key)
		})),
		{ key: '', words: 'Of no part family', rows: rest }
	].filter((one) => one.rows.length > 0);
}
