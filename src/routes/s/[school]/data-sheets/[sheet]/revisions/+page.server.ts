import { pageLoad } from '$lib/server/http/page';
import { readSheetHistory } from '$lib/server/services/courses/sheet-history';
import type { RequestEvent } from './$types';

export const load = pageLoad(readSheetHistory, ({ params }: RequestEvent) => ({
	key: params.sheet
}));
