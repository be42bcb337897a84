import { pageLoad } from '$lib/server/http/page';
import { readDataSheet } from '$lib/server/services/courses/read-data-sheets';
import type { RequestEvent } from './$types';

export const load = pageLoad(readDataSheet, ({ params }: RequestEvent) => ({ key: params.sheet }));
