import { sheetAsCsv } from '$lib/domain/data-sheets/sheet-as-csv';
import type { DataSheet } from '$lib/domain/data-sheets/schema';

export const sheetFileKinds = ['csv', 'json'] as const;
export type SheetFileKind = (typeof sheetFileKinds)[number];

/** A sheet to take away; the JSON can be read into a draft again. */
export function sheetAsFile(sheet: DataSheet, kind: SheetFileKind) {
	const name = `${sheet.key}-${sheet.revision}.${kind}`;
	return kind === 'csv'
		? { name, mediaType: 'text/csv; charset=utf-8', text: sheetAsCsv(sheet) }
		: {
				name,
				mediaType: 'application/json',
				text: `${JSON.stringify(sheet, null, '\t')}\n`
			};
}
