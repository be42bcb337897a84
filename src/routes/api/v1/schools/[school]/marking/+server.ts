import { jsonRead } from '$lib/server/http/json';
import { listWaiting } from '$lib/server/services/marking/list-waiting';

export const GET = jsonRead(listWaiting);
