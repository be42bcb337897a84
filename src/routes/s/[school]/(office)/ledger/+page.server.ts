import { pageLoad } from '$lib/server/http/page';
import { readLedgerPage } from '$lib/server/services/office/read-records';
import type { RequestEvent } from './$types';

export const load = pageLoad(readLedgerPage, ({ url }: RequestEvent) => ({
	before: url.searchParams.get('before') ?? undefined
}));
