import { jsonRead } from '$lib/server/http/json';
import { readReadiness } from '$lib/server/services/health/read-readiness';

/** Whether to send requests here; no answer, or an error, while it starts or its database is gone. */
export const GET = jsonRead(readReadiness);
