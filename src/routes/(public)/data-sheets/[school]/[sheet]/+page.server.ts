import { pageLoad } from '$lib/server/http/page';
import { readPublicSheet } from '$lib/server/services/courses/read-public-sheets';
import type { RequestEvent } from './$types';

export const load = pageLoad(readPublicSheet, ({ params }: RequestEvent) => ({
	key: params.sheet
}));
