import { valuesAt, type SheetDraft } from './draft';
import type { DraftOperation } from './operation';
import { rowTitle } from './row-words';
import { fieldsOf, sections } from './sections';

export type BothSides = { place: string; mine: string; theirs: string };

/**
 * What somebody typed here, beside what the other saved in the same places.
 * @param unsent what is not on the server yet @param theirs the draft as the other saved it
 */
export function bothSides(
	unsent: readonly DraftOperation[],
	theirs: SheetDraft,
	mine: SheetDraft
): BothSides[] {
	return unsent.map((one) => {
		const other = valuesAt(theirs, one.section, one.row);
		const own = valuesAt(mine, one.section, one.row);
		if (one.kind === 'set') {
			const label = fieldsOf(one.section)[one.field]?.label ?? one.field;
			const row = one.section === 'head' ? undefined : rowTitle(one.section, other ?? own ?? {});
			return {
				place: row ? `${row}: ${label}` : label,
				mine: one.value || 'nothing',
				theirs: other ? other[one.field] || 'nothing' : 'the row is taken out'
			};
		}
		const { title } = sections[one.section];
		const words = rowTitle(one.section, (one.kind === 'add' ? one.values : other) ?? own ?? {});
		const isThere = other ? 'it stands there' : 'it does not stand there';
		return one.kind === 'add'
			? { place: title, mine: `new: ${rowTitle(one.section, own ?? one.values)}`, theirs: isThere }
			: { place: title, mine: `taken out: ${words}`, theirs: isThere };
	});
}
