import { jsonWrite } from '$lib/server/http/json';
import { workOnSheetDraft } from '$lib/server/services/courses/work-on-sheet-draft';
import type { RequestEvent } from './$types';

export const POST = jsonWrite(workOnSheetDraft, ({ params }: RequestEvent) => ({
	key: params.sheet
}));
