import { pageLoad } from '$lib/server/http/page';
import { listPublicSheets } from '$lib/server/services/courses/read-public-sheets';

export const load = pageLoad(listPublicSheets);
