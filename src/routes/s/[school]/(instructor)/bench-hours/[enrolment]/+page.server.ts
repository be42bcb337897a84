import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { enterBenchHours, readBenchHours } from '$lib/server/services/progress/bench-hours';
import type { RequestEvent } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({
	enrolmentId: params.enrolment
});

export const load = pageLoad(readBenchHours, (event: RequestEvent) => at(event));

export const actions = { default: formAction(enterBenchHours, { extra: at }) };
