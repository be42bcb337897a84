import { z } from 'zod';
import { headRow, rowsAtMost, type SheetDraft } from './draft';
import { fieldsOf, rowSections, type SectionName } from './sections';

const rowSection = z.enum(rowSections);
const section = z.enum(['head', ...rowSections]);
const rowId = z.string().min(1).max(26);

/** One change that a browser sends: small, so that two people seldom touch the same thing. */
export const draftOperationSchema = z.discriminatedUnion('kind', [
	z.strictObject({
		kind: z.literal('set'),
		section,
		row: rowId,
		field: z.string().max(40),
		value: z.string().max(8000)
	}),
	z.strictObject({
		kind: z.literal('add'),
		section: rowSection,
		row: rowId,
		values: z.record(z.string().max(40), z.string().max(8000)),
		/** Where it stands among its neighbours; at the end when left out. */
		at: z.number().int().min(0).max(rowsAtMost).optional()
	}),
	z.strictObject({ kind: z.literal('remove'), section: rowSection, row: rowId })
]);
export type DraftOperation = z.infer<typeof draftOperationSchema>;

/** Applies one change. Applied again it changes nothing more; what it is about may be gone. */
export function applyToDraft(draft: SheetDraft, operation: DraftOperation): SheetDraft {
	switch (operation.kind) {
		case 'set':
			return set(draft, operation.section, operation.row, operation.field, operation.value);
		case 'add': {
			const { section, row: id, at } = operation;
			const others = draft.rows[section];
			const values = known(section, operation.values);
			if (others.some((one) => one.id === id))
				return withRows(draft, section, (one) => (one.id === id ? { id, values } : one));
			const place = at ?? others.length;
			const rows = [...others.slice(0, place), { id, values }, ...others.slice(place)];
			return { ...draft, rows: { ...draft.rows, [section]: rows } };
		}
		case 'remove': {
			const { section, row } = operation;
			const rows = draft.rows[section].filter((one) => one.id !== row);
			return { ...draft, rows: { ...draft.rows, [section]: rows } };
		}
	}
}

/** While somebody types on in one field, only what it says last need be sent. */
export function followsOn(earlier: DraftOperation, later: DraftOperation): boolean {
	return (
		earlier.kind === 'set' &&
		later.kind === 'set' &&
		earlier.section === later.section &&
		earlier.row === later.row &&
		earlier.field === later.field
	);
}

function set(draft: SheetDraft, section: SectionName, row: string, field: string, value: string) {
	if (!Object.hasOwn(fieldsOf(section), field)) return draft;
	if (section === 'head')
		return row === headRow ? { ...draft, head: { ...draft.head, [field]: value } } : draft;
	return withRows(draft, section, (one) =>
		one.id === row ? { id: row, values: { ...one.values, [field]: value } } : one
	);
}

type Row = SheetDraft['rows']['dimensions'][number];
function withRows(
	draft: SheetDraft,
	section: keyof SheetDraft['rows'],
	change: (row: Row) => Row
): SheetDraft {
	return { ...draft, rows: { ...draft.rows, [section]: draft.rows[section].map(change) } };
}

function known(section: SectionName, values: Record<string, string>): Record<string, string> {
	const fields = fieldsOf(section);
	return Object.fromEntries(Object.entries(values).filter(([name]) => Object.hasOwn(fields, name)));
}
