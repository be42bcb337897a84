/**
 * Rows and cells in one text, as a link carries them: `_` between cells, `*` between rows. Both
 * stay as they are in an address, and neither stands in a figure.
 */
export function cellsOf(text: string): string[][] {
	return text === '' ? [] : text.split('*').map((row) => row.split('_'));
}

/** Without the rows and columns after the last one in which something stands: spare room is no reading. */
export function filledCells(cells: readonly (readonly string[])[]): string[][] {
	const isFilled = (text: string | undefined) => (text ?? '').trim() !== '';
	const rows = cells.findLastIndex((row) => row.some(isFilled)) + 1;
	const columns = Math.max(0, ...cells.map((row) => row.findLastIndex(isFilled) + 1));
	return cells
		.slice(0, rows)
		.map((row) => Array.from({ length: columns }, (_, at) => row[at] ?? ''));
}

export function textOf(cells: readonly (readonly string[])[]): string {
	const clean = (one: string) => one.replace(/[_*]/g, ' ').trim();
	return cells.map((row) => row.map(clean).join('_')).join('*');
}

/**
 * A block as a spreadsheet puts it on the clipboard: rows on lines, cells between tabs or
 * semicolons, and between commas only where a comma cannot be a decimal mark.
 */
export function pastedCells(text: string): string[][] {
	const lines = text.replace(/\r\n?/g, '\n').replace(/\n+$/, '').split('\n');
	const mark = /\t/.test(text)
		? /\t/
		: /;/.test(text)
			? /;/
			: /\d,\s|\.\d+,/.test(text)
				? /,/
				: undefined;
	return lines.map((line) =>
		(mark ? line.split(mark) : line.trim().split(/\s+/)).map((one) => one.trim())
	);
}
