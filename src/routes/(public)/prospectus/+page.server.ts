import { pageLoad } from '$lib/server/http/page';
import { readProspectus } from '$lib/server/services/courses/read-prospectus';

export const load = pageLoad(readProspectus);
