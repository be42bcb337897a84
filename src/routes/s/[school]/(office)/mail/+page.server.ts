import { pageLoad } from '$lib/server/http/page';
import { readMails } from '$lib/server/services/office/read-records';

export const load = pageLoad(readMails);
