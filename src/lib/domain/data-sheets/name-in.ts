import { keyedThings, type DataSheet } from './schema';

/** What a key of a sheet is called: the words of its value, or of the sheet's own head. */
export function nameIn(sheet: DataSheet, key: string): string {
	if (key === 'title') return 'Title';
	if (key === 'layout') return 'Layout';
	const found = keyedThings(sheet).find((one) => one.key === key);
	return found && 'words' in found ? String(found.words) : key;
}
