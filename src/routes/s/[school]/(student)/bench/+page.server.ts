import { pageLoad } from '$lib/server/http/page';
import { readBench } from '$lib/server/services/learning/read-bench';

export const load = pageLoad(readBench);
