import type { Finding } from '$lib/domain/data-sheets/consistency/finding';
import type { DraftRow, SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import type { Choice, Field } from '$lib/domain/data-sheets/draft/field';
import type { DraftOperation } from '$lib/domain/data-sheets/draft/operation';
import type { DraftFault } from '$lib/domain/data-sheets/draft/read-draft';
import { rowTitle } from '$lib/domain/data-sheets/draft/row-words';
import type { SectionName } from '$lib/domain/data-sheets/draft/sections';
import type { TypedChanges } from '$lib/domain/data-sheets/draft/typed-change';

/** What every part of the editor is given: the draft as typed, what is wrong with it, what it was. */
export type Editing = {
	draft: SheetDraft;
	faults: readonly DraftFault[];
	/** What does not agree with the rest of the sheet; none while something cannot be read. */
	findings: readonly Finding[];
	/** Against the published revision; undefined where there is none. */
	changes: TypedChanges | undefined;
	/** Who teaches from which key, in words. */
	usedBy: ReadonlyMap<string, readonly string[]>;
	newId: () => string;
	do: (operation: DraftOperation) => void;
};

/** The id of a field on the page: what a fault leads to. */
export function fieldId(section: SectionName, row: string, field: string): string {
	return `f-${section}-${row}-${field}`;
}

export function problemsAt(
	faults: readonly DraftFault[],
	section: SectionName,
	row: string,
	field: string
): string[] {
	return faults
		.filter((one) => one.section === section && one.row === row && one.field === field)
		.map((one) => one.words);
}

/** What can be chosen in a field: its own choices, or the draft's rows by their keys. */
export function optionsOf(field: Field, draft: SheetDraft): readonly Choice[] {
	const { optionsFrom } = field;
	if (!optionsFrom) return field.options ?? [];
	return draft.rows[optionsFrom]
		.filter((one) => one.values.key?.trim())
		.map(({ values }: DraftRow) => ({
			value: values.key ?? '',
			words: `${rowTitle(optionsFrom, values)} (${values.key})`
		}));
}
