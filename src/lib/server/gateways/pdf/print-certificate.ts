import PDFDocument from 'pdfkit';
import { buffer } from 'node:stream/consumers';
import { PassThrough } from 'node:stream';
import type { CertificateFace } from '$lib/domain/certificates/face';
import { writeCertificate } from './certificate-body';
import { makeFlow } from './flow';
import { registerFonts } from './fonts';
import { makePen } from './pen';
import { drawBorder, drawCheck, drawTitleBlock } from './sheet-frame';

export type PrintQuestion = { face: CertificateFace; checkAddress: string };

/** The same face and address give the same bytes: the only time in the file is the award's. */
export async function printCertificate(question: PrintQuestion): Promise<Uint8Array> {
	// "Sheet 1 / n" needs n, so it is set once to be counted.
	const sheets = set(makeDocument(question.face), question, 1);
	const doc = makeDocument(question.face);
	const bytes = buffer(doc.pipe(new PassThrough()));
	set(doc, question, sheets);
	doc.end();
	return bytes;
}

function makeDocument(face: CertificateFace): PDFKit.PDFDocument {
	const doc = new PDFDocument({
		size: 'A4',
		margin: 0,
		autoFirstPage: false,
		pdfVersion: '1.7',
		tagged: true,
		lang: 'en',
		displayTitle: true,
		info: {
			Title: `Certificate: ${face.course.title}, ${face.personName}`,
			Author: face.school.name,
			Subject: face.code,
			Creator: 'Ringland',
			Producer: 'Ringland',
			CreationDate: new Date(`${face.awardedOn}T00:00:00Z`),
			ModDate: new Date(`${face.awardedOn}T00:00:00Z`)
		}
	});
	registerFonts(doc);
	return doc;
}

/** @returns how many sheets it took */
function set(doc: PDFKit.PDFDocument, { face, checkAddress }: PrintQuestion, sheets: number) {
	const pen = makePen(doc);
	const root = doc.struct('Document');
	doc.addStructure(root);
	let sheet = 0;
	// Read aloud after what stands above it, so it is drawn when its sheet is full.
	const finishSheet = () => {
		drawTitleBlock(pen, root, face, { sheet, sheets });
		if (sheet === 1) drawCheck(pen, root, checkAddress);
	};
	const flow = makeFlow(pen, root, () => {
		if (sheet > 0) finishSheet();
		doc.addPage();
		drawBorder(pen);
		return ++sheet;
	});
	writeCertificate(flow, face);
	finishSheet();
	root.end();
	return sheet;
}
