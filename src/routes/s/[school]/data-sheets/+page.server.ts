import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { beginNewSheet, beginSheetFromFile } from '$lib/server/services/courses/begin-sheet-draft';
import { listDataSheets } from '$lib/server/services/courses/read-data-sheets';

export const load = pageLoad(listDataSheets);

const toDraft = (
	{ key }: { key: string },
	{ params }: { params: Record<string, string | undefined> }
) => `/s/${params.school}/data-sheets/${key}/draft`;

export const actions = {
	begin: formAction(beginNewSheet, { done: toDraft }),
	'from-file': formAction(beginSheetFromFile, { done: toDraft })
};
