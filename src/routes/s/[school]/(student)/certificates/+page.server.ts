import { pageLoad } from '$lib/server/http/page';
import { listOwnCertificates } from '$lib/server/services/awards/certificates';

export const load = pageLoad(listOwnCertificates);
