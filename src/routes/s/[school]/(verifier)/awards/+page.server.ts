import { pageLoad } from '$lib/server/http/page';
import { listAwards } from '$lib/server/services/awards/read-awards';

export const load = pageLoad(listAwards);
