import type { CertificateFace } from '$lib/domain/certificates/face';
import { dayWords, hoursWords } from '$lib/domain/certificates/words';
import { qrMatrix, qrPath } from '../qr/qr';
import { colour, paper, type Element, type Pen, type Style } from './pen';

const label: Style = { font: 'label', sizePt: 6.5, colour: colour.soft, spacingPt: 0.4 };
const value: Style = { font: 'body', sizePt: 8.5 };
const strong: Style = { ...value, font: 'strong' };
const figure: Style = { font: 'figure', sizePt: 8.5 };

const outerPt = 22;
const innerPt = 31;
const columnsPt = [158, 56, 84, 112] as const;
const blockWidthPt = columnsPt.reduce((sum, one) => sum + one, 0);
const blockLeftPt = paper.widthPt - innerPt - blockWidthPt;
const rowsPt = [38, 38] as const;
const blockTopPt = paper.heightPt - innerPt - rowsPt[0] - rowsPt[1];
const qrPt = 72;

/** Where the body must end: above the title block, and on the first sheet above the QR code. */
export function bodyEndPt(sheet: number): number {
	return (sheet === 1 ? paper.heightPt - innerPt - qrPt - 42 : blockTopPt) - 14;
}

/** Thin double border with zone marks, as on a drawing. */
export function drawBorder({ artifact, doc, write }: Pen): void {
	const { widthPt, heightPt } = paper;
	artifact(() => {
		doc
			.lineWidth(0.6)
			.rect(outerPt, outerPt, widthPt - 2 * outerPt, heightPt - 2 * outerPt)
			.stroke(colour.rule);
		doc
			.lineWidth(1.1)
			.rect(innerPt, innerPt, widthPt - 2 * innerPt, heightPt - 2 * innerPt)
			.stroke(colour.ink);
		const zone: Style = { font: 'label', sizePt: 6, colour: colour.soft };
		['1', '2', '3', '4'].forEach((one, at) =>
			write(zone, one, innerPt + ((at + 0.5) * (widthPt - 2 * innerPt)) / 4, outerPt + 1, 10)
		);
		['A', 'B', 'C', 'D', 'E', 'F'].forEach((one, at) =>
			write(zone, one, outerPt + 3, innerPt + ((at + 0.5) * (heightPt - 2 * innerPt)) / 6, 10)
		);
	});
}

/** What the sheet is: real data only. Read aloud on the first sheet, passed over on the others. */
export function drawTitleBlock(
	pen: Pen,
	parent: Element,
	face: CertificateFace,
	{ sheet, sheets }: { sheet: number; sheets: number }
): void {
	const school = face.school.place ? `${face.school.name}, ${face.school.place}` : face.school.name;
	const cells: [string, string, Style][][] = [
		[
			['Course', face.course.title, strong],
			['Sheet', `${sheet} / ${sheets}`, figure],
			['Revision', face.course.revision, figure],
			['Awarded on', dayWords(face.awardedOn), value]
		],
		[
			['School', school, strong],
			['At the bench', hoursWords(face.benchMinutes), value],
			['Decided by', `${face.decidedBy.name}, ${face.decidedBy.schoolName}`, value],
			['Code', face.code, figure]
		]
	];
	pen.artifact(() => lines(pen));
	const section = sheet === 1 ? pen.element(parent, 'Sect') : undefined;
	let yPt = blockTopPt;
	cells.forEach((row, r) => {
		let xPt = blockLeftPt;
		row.forEach(([name, words, style], c) => {
			const widthPt = (columnsPt[c] ?? 0) - 10;
			const at = { xPt: xPt + 5, yPt: yPt + 4, widthPt };
			const draw = () => {
				const end = pen.write(label, name.toUpperCase(), at.xPt, at.yPt, widthPt);
				pen.write(fitting(pen, style, words, widthPt), words, at.xPt, end + 1, widthPt);
			};
			if (section) pen.mark(pen.element(section, 'P'), 'P', draw);
			else pen.artifact(draw);
			xPt += columnsPt[c] ?? 0;
		});
		yPt += rowsPt[r] ?? 0;
	});
}

/** A long name gets smaller rather than leave its cell. */
function fitting(pen: Pen, style: Style, text: string, widthPt: number): Style {
	for (let sizePt = style.sizePt; sizePt > 4; sizePt -= 0.5)
		if (pen.heightOf({ ...style, sizePt }, text, widthPt) <= 23) return { ...style, sizePt };
	return { ...style, sizePt: 4 };
}

function lines({ doc }: Pen): void {
	doc.lineWidth(0.8).strokeColor(colour.ink);
	let xPt = blockLeftPt;
	const bottomPt = blockTopPt + rowsPt[0] + rowsPt[1];
	for (const widthPt of columnsPt) {
		doc.moveTo(xPt, blockTopPt).lineTo(xPt, bottomPt).stroke();
		xPt += widthPt;
	}
	for (const yPt of [blockTopPt, blockTopPt + rowsPt[0]])
		doc
			.moveTo(blockLeftPt, yPt)
			.lineTo(blockLeftPt + blockWidthPt, yPt)
			.stroke();
}

/** The code that leads to the page where anyone can check, and the same address to type. */
export function drawCheck(pen: Pen, parent: Element, checkAddress: string): void {
	const { doc } = pen;
	const yPt = paper.heightPt - innerPt - qrPt - 40;
	const alt = `QR code of the address where this certificate can be checked: ${checkAddress}`;
	pen.mark(pen.element(parent, 'Figure', { alt }), 'Figure', () => {
		const matrix = qrMatrix(checkAddress, 'M');
		doc.save();
		doc.translate(paper.leftPt - 6, yPt).scale(qrPt / matrix.size);
		doc.path(qrPath(matrix)).fill('#000000');
		doc.restore();
	});
	pen.say(
		parent,
		'P',
		{ font: 'body', sizePt: 7, colour: colour.soft },
		`Check it at ${checkAddress}`,
		{
			xPt: paper.leftPt - 6,
			yPt: yPt + qrPt + 6,
			widthPt: blockLeftPt - paper.leftPt
		}
	);
}
