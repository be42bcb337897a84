import { z } from 'zod';
import { list } from './codecs';
import { fieldsOf, head, rowSections, type RowSection, type SectionName } from './sections';

const typed = z.record(z.string().max(40), z.string().max(8000));
const row = z.strictObject({ id: z.string().min(1).max(26), values: typed });
export const rowsAtMost = 500;

/** A data sheet as somebody types it: text in every field, whether or not it can be read yet. */
export const sheetDraftSchema = z.strictObject({
	head: typed,
	rows: z.strictObject(
		Object.fromEntries(
			rowSections.map((name) => [name, z.array(row).max(rowsAtMost).default([])])
		) as Record<RowSection, z.ZodDefault<z.ZodArray<typeof row>>>
	)
});
export type SheetDraft = z.infer<typeof sheetDraftSchema>;
export type DraftRow = z.infer<typeof row>;

/** The name of the head's one row, where a row is asked for. */
export const headRow = 'head';

export function valuesAt(draft: SheetDraft, section: SectionName, rowId: string) {
	return section === 'head'
		? draft.head
		: draft.rows[section].find((one) => one.id === rowId)?.values;
}

/**
 * Whatever somebody wrote as a sheet, faulty or not, as it would be typed. A sheet that can be
 * read comes back the same when it is read again.
 * @param written a sheet, or what a file says in its place
 * @returns the draft, and the places of what has no field
 */
export function draftFrom(written: unknown): { draft: SheetDraft; leftOut: string[] } {
	const leftOut: string[] = [];
	const sheet = record(written);
	const known = new Set(['key', 'revision', 'issuedOn', ...rowSections]);
	for (const path of Object.values(head).map((one) => one.path))
		known.add(path.split('.')[0] ?? '');
	leftOut.push(...Object.keys(sheet).filter((name) => !known.has(name)));
	const rows = Object.fromEntries(
		rowSections.map((section) => [
			section,
			list(sheet[section]).map((one, at) => ({
				id: String(at + 1),
				values: typedOf(section, one, `${section} ${at + 1}`, leftOut)
			}))
		])
	) as SheetDraft['rows'];
	return { draft: { head: typedOf('head', written, '', []), rows }, leftOut };
}

function typedOf(section: SectionName, one: unknown, place: string, leftOut: string[]) {
	const fields = Object.entries(fieldsOf(section));
	const known = new Set(fields.map(([, { path }]) => path.split('.')[0]));
	for (const name of Object.keys(record(one)))
		if (place && !known.has(name)) leftOut.push(`${place}, ${name}`);
	const values: Record<string, string> = {};
	for (const [name, { path, codec }] of fields) {
		const text = codec.write(at(one, path));
		if (text !== '') values[name] = text;
	}
	return values;
}

function at(one: unknown, path: string): unknown {
	return path.split('.').reduce<unknown>((held, name) => record(held)[name], one);
}

function record(value: unknown): Record<string, unknown> {
	return value !== null && typeof value === 'object' && !Array.isArray(value)
		? (value as Record<string, unknown>)
		: {};
}
