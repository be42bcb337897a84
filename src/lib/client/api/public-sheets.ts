import { dataSheetSchema, type DataSheet } from '$lib/domain/data-sheets/schema';

export type ListedSheet = {
	school: string;
	title: string;
	code: string;
	revision: string;
	href: string;
};

/** The data sheets that anybody may read; none where nothing answers. */
export async function listPublicSheets(): Promise<ListedSheet[]> {
	const answer = await fetch('/data-sheets/index.json');
	if (!answer.ok) throw new Error('the list of data sheets did not come');
	return ((await answer.json()) as { sheets: ListedSheet[] }).sheets;
}

/** One of them, whole. Its form is checked: what cannot be read fills no field. */
export async function readPublicSheet(href: string): Promise<DataSheet> {
	const answer = await fetch(`${href}.json`);
	if (!answer.ok) throw new Error('the data sheet did not come');
	return dataSheetSchema.parse(await answer.json());
}
