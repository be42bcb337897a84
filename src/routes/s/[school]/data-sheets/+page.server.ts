import { pageLoad } from '$lib/server/http/page';
import { listDataSheets } from '$lib/server/services/courses/read-data-sheets';

export const load = pageLoad(listDataSheets);
