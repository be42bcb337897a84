import { pageLoad } from '$lib/server/http/page';
import { listWaiting } from '$lib/server/services/marking/list-waiting';

export const load = pageLoad(listWaiting);
