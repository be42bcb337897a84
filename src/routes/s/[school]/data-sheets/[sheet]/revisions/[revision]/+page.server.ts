import { pageLoad } from '$lib/server/http/page';
import { readSheetRevision } from '$lib/server/services/courses/sheet-history';
import type { RequestEvent } from './$types';

export const load = pageLoad(readSheetRevision, ({ params }: RequestEvent) => ({
	key: params.sheet,
	revision: params.revision
}));
