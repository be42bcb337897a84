import { pageLoad } from '$lib/server/http/page';
import { listProgress } from '$lib/server/services/progress/read-progress';

export const load = pageLoad(listProgress);
