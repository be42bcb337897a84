import { Problem } from '$lib/domain/problem';
import { ChildFault, makeChild } from '../child/child';
import source from './pdf-child?child';
import type { PrintQuestion } from './print-certificate';

export type PdfPrinter = {
	/**
	 * A certificate as a tagged PDF. The same face and address give the same bytes.
	 * @throws Problem 'refused' where the fonts lack a letter; 'unavailable' to try again later
	 */
	printCertificate: (question: PrintQuestion) => Promise<Buffer>;
	close: () => Promise<void>;
};

export function makePdfPrinter({ answerWithinMs = 20_000 } = {}): PdfPrinter {
	const child = makeChild<PrintQuestion, Uint8Array>({
		source,
		nextTo: import.meta.url,
		heapMb: 256,
		answerWithinMs
	});
	return {
		async printCertificate(question) {
			const bytes = await child.ask(question).catch((error: unknown) => {
				if (!(error instanceof ChildFault)) throw error;
				const problem = new Problem(
					'unavailable',
					'The certificate could not be printed just now.'
				);
				problem.cause = error;
				throw problem;
			});
			return Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
		},
		close: child.close
	};
}
