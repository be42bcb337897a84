import { pageLoad } from '$lib/server/http/page';
import { checkCertificate } from '$lib/server/services/awards/certificates';
import type { PageServerLoad, RequestEvent } from './$types';

const read = pageLoad(checkCertificate, ({ params }: RequestEvent) => ({ code: params.code }));

export const load: PageServerLoad = (event) => {
	// Whether it stands may change at any moment: nothing between may keep an old answer.
	event.setHeaders({ 'cache-control': 'no-store' });
	return read(event);
};
