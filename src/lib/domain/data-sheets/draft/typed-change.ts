import { headRow, type SheetDraft } from './draft';
import { fieldsOf, rowSections, type RowSection, type SectionName } from './sections';

export type TypedChanges = {
	/** What stood in a field before; undefined where it says the same now. */
	was: (section: SectionName, row: string, field: string) => string | undefined;
	isNew: (section: RowSection, row: string) => boolean;
};

/** A draft against what it was begun from, field by field, also where it cannot be read yet. */
export function typedChanges(before: SheetDraft, now: SheetDraft): TypedChanges {
	const rows = new Map<string, { was: Values | undefined; now: Values }>();
	rows.set(`head/${headRow}`, { was: before.head, now: now.head });
	for (const section of rowSections) {
		const named = new Map(
			before.rows[section].map(({ values }) => [nameOf(section, values), values])
		);
		for (const { id, values } of now.rows[section])
			rows.set(`${section}/${id}`, { was: named.get(nameOf(section, values)), now: values });
	}
	return {
		was(section, row, field) {
			const pair = rows.get(`${section}/${row}`);
			if (!pair?.was) return undefined;
			const text = pair.was[field] ?? '';
			const isSame = saysTheSame(section, field, text, pair.now[field] ?? '', pair.now.unit);
			return isSame ? undefined : text;
		},
		isNew: (section, row) => rows.get(`${section}/${row}`)?.was === undefined
	};
}

type Values = Readonly<Record<string, string>>;

/** Rows are the same one by their key, or by what stands in its place. */
function nameOf(section: RowSection, values: Values): string {
	const field = section === 'fits' ? 'clearance' : section === 'fluids' ? 'words' : 'key';
	return (values[field] ?? '').trim();
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
