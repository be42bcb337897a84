import { dataSheetSchema, type DataSheet, type Dimension } from '../schema';
import { dimensionSchema } from '../schema/dimension';
import { headRow, type SheetDraft } from './draft';
import { issueWords } from './issue-words';
import { fieldsOf, rowSections, sections, type RowSection, type SectionName } from './sections';

/** What is wrong, and in which field; `sheet` where it is about the sheet as a whole. */
export type DraftFault = {
	section: SectionName | 'sheet';
	row: string;
	field: string;
	words: string;
};
/** What the typed text does not say: the server sets it when the sheet is published. */
export type Stamp = { key: string; revision: string; issuedOn: string };
export type ReadDraft = { faults: DraftFault[]; sheet?: DataSheet };

/** Reads a draft as a sheet. Only what can be read from the first field to the last is one. */
export function readDraft(draft: SheetDraft, stamp: Stamp): ReadDraft {
	const faults: DraftFault[] = [];
	const written: Record<string, unknown> = {
		...readRow('head', headRow, draft.head, faults),
		...stamp
	};
	for (const section of rowSections)
		written[section] = draft.rows[section].map(({ id, values }) =>
			readRow(section, id, values, faults)
		);
	const parsed = dataSheetSchema.safeParse(written, { error: issueWords });
	if (parsed.success) return faults.length === 0 ? { faults, sheet: parsed.data } : { faults };
	const unread = new Set(faults.map((one) => `${one.section}/${one.row}`));
	for (const { path, message } of parsed.error.issues) {
		const fault = place(draft, path, message);
		// A field that cannot be read is missing as well, and that need not be said twice.
		if (!unread.has(`${fault.section}/${fault.row}`)) faults.push(fault);
	}
	return { faults };
}

/** The dimensions that can be read so far, whatever else is still to be put right. */
export function dimensionsReadSoFar(draft: SheetDraft): Dimension[] {
	return draft.rows.dimensions.flatMap(({ id, values }) => {
		const faults: DraftFault[] = [];
		const read = dimensionSchema.safeParse(readRow('dimensions', id, values, faults));
		return read.success && faults.length === 0 ? [read.data] : [];
	});
}

function readRow(
	section: SectionName,
	row: string,
	values: Readonly<Record<string, string>>,
	faults: DraftFault[]
): Record<string, unknown> {
	const object: Record<string, unknown> = {};
	for (const [field, { path, codec }] of Object.entries(fieldsOf(section))) {
		const text = values[field] ?? '';
		if (text.trim() === '') continue;
		const found = codec.read(text, values.unit ?? 'mm');
		if (found.ok) lay(object, path.split('.'), found.value);
		else faults.push({ section, row, field, words: `This cannot be read: ${found.because}.` });
	}
	return object;
}

function lay(
	object: Record<string, unknown>,
	[name = '', ...rest]: string[],
	value: unknown
): void {
	if (rest.length === 0) object[name] = value;
	else lay((object[name] ??= {}) as Record<string, unknown>, rest, value);
}

/** The field that an issue is about. */
function place(draft: SheetDraft, path: readonly PropertyKey[], words: string): DraftFault {
	const [first, at, ...rest] = path;
	if (rowSections.includes(first as RowSection)) {
		const section = first as RowSection;
		const row = typeof at === 'number' ? draft.rows[section][at] : undefined;
		if (!row)
			return {
				section: 'sheet',
				row: '',
				field: '',
				words: `${sections[section].title}: ${words}`
			};
		return { section, row: row.id, field: fieldAt(section, rest), words };
	}
	if (first !== undefined)
		return { section: 'head', row: headRow, field: fieldAt('head', path), words };
	return named(draft, words) ?? { section: 'sheet', row: '', field: '', words };
}

/** The field whose path is meant; a rule of a whole row stands at its first figure. */
function fieldAt(section: SectionName, path: readonly PropertyKey[]): string {
	const wanted = path.filter((one) => typeof one === 'string').join('.');
	const fields = Object.entries(fieldsOf(section));
	const found =
		fields.find(([, one]) => one.path === wanted) ??
		fields.find(([, one]) => wanted !== '' && one.path.startsWith(`${wanted}.`)) ??
		fields.find(([, one]) => wanted.startsWith(`${one.path}.`)) ??
		fields.find(([, one]) => one.input === 'figure' || one.input === 'table') ??
		fields[0];
	return found?.[0] ?? '';
}

/** A rule between rows names a key: the last row that has it is where it is put right. */
function named(draft: SheetDraft, words: string): DraftFault | undefined {
	const [name] = /[a-z][A-Za-z0-9]*(\.[a-z][A-Za-z0-9]*)+/.exec(words) ?? [];
	if (!name) return undefined;
	for (const section of rowSections) {
		const field = section === 'fits' ? 'clearance' : 'key';
		const row = draft.rows[section].findLast((one) => one.values[field]?.trim() === name);
		if (row && (section === 'fits') === words.startsWith('the fit'))
			return { section, row: row.id, field, words: `${words}.` };
	}
	return undefined;
}
