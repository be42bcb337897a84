import { jsonRead } from '$lib/server/http/json';
import { readCohorts } from '$lib/server/services/cohorts/read-cohorts';

export const GET = jsonRead(readCohorts);
