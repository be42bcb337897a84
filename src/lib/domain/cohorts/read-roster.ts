import { parse } from 'csv-parse/sync';

export type RosterRow = { line: number; name: string; email: string; studentNumber: string };
export type RosterReading = { rows: RosterRow[]; fault?: string };

const headings: Record<keyof Omit<RosterRow, 'line'>, RegExp> = {
	email: /^e-?mail( address)?$/i,
	name: /^(full )?name$/i,
	studentNumber: /^(student )?(number|no\.?|id)$/i
};
export const longestRoster = 500;

/**
 * Reads a pasted or uploaded list: CSV (RFC 4180), or with semicolons or tabs as spreadsheets
 * give it. A first line of headings may put the columns in any order; without one they are
 * name, e-mail, student number. Nothing is judged here beyond the form of the file.
 */
export function readRoster(text: string): RosterReading {
	const clean = text.replace(/^\uFEFF/, '');
	if (clean.trim() === '') return { rows: [], fault: 'The list is empty.' };
	let records: { record: string[]; info: { lines: number } }[];
	try {
		records = parse(clean, {
			delimiter: delimiterOf(clean),
			relax_column_count: true,
			skip_empty_lines: true,
			trim: true,
			info: true
		}) as unknown as typeof records;
	} catch (error) {
		const where =
			error instanceof Error && 'lines' in error ? ` (line ${String(error.lines)})` : '';
		return {
			rows: [],
			fault: `The list cannot be read as CSV: a quotation mark is left open${where}.`
		};
	}
	const first = records[0]?.record ?? [];
	const order = headingOrder(first);
	if (order === 'no e-mail')
		return {
			rows: [],
			fault: 'The headings name no e-mail column. Use: name, e-mail, student number.'
		};
	const body = order ? records.slice(1) : records;
	if (body.length === 0) return { rows: [], fault: 'The list has headings but no rows.' };
	if (body.length > longestRoster)
		return {
			rows: [],
			fault: `The list has ${body.length} rows. Send at most ${longestRoster} at a time.`
		};
	const at = order ?? { name: 0, email: 1, studentNumber: 2 };
	return {
		rows: body.map(({ record, info }) => ({
			line: info.lines,
			name: record[at.name] ?? '',
			email: (record[at.email] ?? '').toLowerCase(),
			studentNumber: record[at.studentNumber] ?? ''
		}))
	};
}

function delimiterOf(text: string): string {
	const line = text.slice(0, text.search(/\r?\n|$/));
	return ['\t', ';'].find((one) => line.includes(one)) ?? ',';
}

function headingOrder(cells: string[]) {
	const place = (pattern: RegExp) => cells.findIndex((cell) => pattern.test(cell));
	const found = {
		name: place(headings.name),
		email: place(headings.email),
		studentNumber: place(headings.studentNumber)
	};
	if (found.email < 0 && found.name < 0) return undefined;
	return found.email < 0 ? 'no e-mail' : found;
}
