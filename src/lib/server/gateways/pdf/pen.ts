import { fontFor, type FontName } from './fonts';

export const paper = {
	widthPt: 595.28,
	heightPt: 841.89,
	/** Where text may stand: inside the inner border and its margin. */
	leftPt: 54,
	rightPt: 541.28,
	topPt: 54
} as const;

/** The light theme's colours. */
export const colour = {
	ink: '#16202b',
	soft: '#4b5966',
	rule: '#c9c6ba',
	layout: '#14407a',
	layoutWash: '#e3ecf6',
	brass: '#8a6416',
	chromate: '#3d6b2f'
} as const;

export type Style = {
	font: FontName;
	sizePt: number;
	colour?: string;
	/** Added to each line's own height. */
	leadPt?: number;
	spacingPt?: number;
	centred?: boolean;
};

export type Element = PDFKit.PDFStructureElement;

export type Pen = ReturnType<typeof makePen>;

/**
 * Draws text with its meaning: every piece is either content with a tag, which a screen reader
 * reads, or an artifact, which it passes over. Nothing is drawn outside of both.
 */
export function makePen(doc: PDFKit.PDFDocument) {
	const set = ({ font, sizePt, colour: fill = colour.ink }: Style, text: string) =>
		doc
			.font(fontFor(doc, font, text))
			.fontSize(sizePt)
			.fillColor(fill);
	const options = (style: Style, widthPt: number) => ({
		width: widthPt,
		lineGap: style.leadPt ?? 0,
		characterSpacing: style.spacingPt ?? 0,
		align: style.centred ? ('center' as const) : ('left' as const)
	});
	const pen = {
		doc,
		element(parent: Element, tag: string, says?: { alt?: string; scope?: string }): Element {
			const made = doc.struct(tag, says ?? {});
			parent.add(made);
			return made;
		},
		/** Content of an element that exists: the marks of one page. */
		mark(element: Element, tag: string, draw: () => void): void {
			const content = doc.markStructureContent(tag);
			draw();
			doc.endMarkedContent();
			element.add(content);
		},
		artifact(draw: () => void): void {
			doc.save();
			doc.markContent('Artifact', { type: 'Layout' });
			draw();
			doc.endMarkedContent();
			doc.restore();
		},
		heightOf(style: Style, text: string, widthPt: number): number {
			return set(style, text).heightOfString(text, options(style, widthPt));
		},
		/** @returns where the next thing may stand */
		write(style: Style, text: string, xPt: number, yPt: number, widthPt: number): number {
			set(style, text).text(text, xPt, yPt, options(style, widthPt));
			return yPt + pen.heightOf(style, text, widthPt);
		},
		/** An element with one piece of text. */
		say(parent: Element, tag: string, style: Style, text: string, at: At): number {
			let end = at.yPt;
			pen.mark(pen.element(parent, tag), tag, () => {
				end = pen.write(style, text, at.xPt, at.yPt, at.widthPt);
			});
			return end;
		}
	};
	return pen;
}

export type At = { xPt: number; yPt: number; widthPt: number };
