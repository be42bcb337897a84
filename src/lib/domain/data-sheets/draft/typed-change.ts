import type { SheetDraft } from './draft';
import { headRow } from './draft';
import { fieldsOf, rowSections, type RowSection, type SectionName } from './sections';

export type TypedChanges = {
	/** What stood in a field before; undefined where it says the same now. */
	was: (section: SectionName, row: string, field: string) => string | undefined;
	isNew: (section: RowSection, row: string) => boolean;
	/** Rows that stood in the sheet and do not stand in the draft any more. */
	gone: { section: RowSection; words: string }[];
};

/** A draft against what it was begun from, field by field, also where it cannot be read yet. */
export function typedChanges(before: SheetDraft, now: SheetDraft): TypedChanges {
	const pairs = new Map<string, Values | undefined>([[`head/${headRow}`, before.head]]);
	const gone: TypedChanges['gone'] = [];
	for (const section of rowSections) {
		for (const row of now.rows[section])
			pairs.set(`${section}/${row.id}`, twin(section, row.values, before.rows[section]));
		for (const row of before.rows[section])
			if (!twin(section, row.values, now.rows[section]))
				gone.push({ section, words: row.values.words ?? nameOf(section, row.values) });
	}
	return {
		was(section, row, field) {
			const values = pairs.get(`${section}/${row}`);
			const held =
				section === 'head' ? now.head : now.rows[section].find((one) => one.id === row)?.values;
			if (!values || !held) return undefined;
			const text = values[field] ?? '';
			return saysTheSame(section, field, text, held[field] ?? '', held.unit) ? undefined : text;
		},
		isNew: (section, row) => pairs.get(`${section}/${row}`) === undefined,
		gone
	};
}

type Values = Readonly<Record<string, string>>;

/** Rows are the same one by their key, or by what stands in its place. */
function nameOf(section: RowSection, values: Values): string {
	const field = section === 'fits' ? 'clearance' : section === 'fluids' ? 'words' : 'key';
	return (values[field] ?? '').trim();
}

function twin(section: RowSection, values: Values, among: readonly { values: Values }[]) {
	const name = nameOf(section, values);
	return among.find((one) => nameOf(section, one.values) === name)?.values;
}

/** "74.0" and "74,00" are one figure. */
function saysTheSame(section: SectionName, field: string, a: string, b: string, unit = 'mm') {
	if (a.trim() === b.trim()) return true;
	const codec = fieldsOf(section)[field]?.codec;
	const [left, right] = [codec?.read(a, unit), codec?.read(b, unit)];
	return Boolean(
		left?.ok && right?.ok && JSON.stringify(left.value) === JSON.stringify(right.value)
	);
}
