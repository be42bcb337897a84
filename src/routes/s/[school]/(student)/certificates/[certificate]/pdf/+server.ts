import { answered } from '$lib/server/http/json';
import { printCertificate } from '$lib/server/services/awards/certificates';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = (event) =>
	answered(event, async () => {
		const { pdf, fileName } = await printCertificate(await event.locals.caller(), {
			certificateId: event.params.certificate
		});
		return new Response(new Uint8Array(pdf), {
			headers: {
				'content-type': 'application/pdf',
				'content-length': String(pdf.byteLength),
				'content-disposition': `attachment; filename="${fileName}"`,
				'cache-control': 'private, no-store'
			}
		});
	});
