import { formAction } from '$lib/server/http/form';
import { pageLoad } from '$lib/server/http/page';
import { withdrawCertificate } from '$lib/server/services/awards/certificates';
import { decideAward } from '$lib/server/services/awards/decide-award';
import { readAward } from '$lib/server/services/awards/read-awards';
import type { RequestEvent } from './$types';

const at = ({ params }: { params: Record<string, string | undefined> }) => ({
	awardId: params.award
});

export const load = pageLoad(readAward, (event: RequestEvent) => at(event));

export const actions = {
	decide: formAction(decideAward, { extra: at }),
	withdraw: formAction(withdrawCertificate)
};
