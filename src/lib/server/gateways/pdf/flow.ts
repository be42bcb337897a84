import { bodyEndPt } from './sheet-frame';
import { colour, paper, type Element, type Pen, type Style } from './pen';

export type Flow = ReturnType<typeof makeFlow>;

const body: Style = { font: 'body', sizePt: 9.5, leadPt: 1.5 };
const heading: Style = { font: 'heading', sizePt: 13 };
const widthPt = paper.rightPt - paper.leftPt;

/** Sets blocks one below the other and begins a sheet when one does not fit. A block is never cut. */
export function makeFlow(pen: Pen, root: Element, newSheet: () => number) {
	let sheet = newSheet();
	let yPt: number = paper.topPt;

	const room = (neededPt: number) => {
		if (yPt + neededPt <= bodyEndPt(sheet)) return;
		sheet = newSheet();
		yPt = paper.topPt;
	};
	const flow = {
		pen,
		root,
		at: () => yPt,
		skip(byPt: number) {
			yPt += byPt;
		},
		/** Room for a heading and the beginning of what follows: no heading stands alone. */
		heading(text: string, followedByPt = 30) {
			room(24 + followedByPt);
			yPt = pen.say(root, 'H2', heading, text, { xPt: paper.leftPt, yPt: yPt + 9, widthPt }) + 3;
		},
		block(parent: Element, tag: string, text: string, style: Style = body, indentPt = 0) {
			const at = { xPt: paper.leftPt + indentPt, widthPt: widthPt - indentPt };
			room(pen.heightOf(style, text, at.widthPt));
			yPt = pen.say(parent, tag, style, text, { ...at, yPt });
		},
		/** @param ring whether the lines are numbered in balloons, else they begin with a dash */
		list(lines: readonly string[], { ring = false } = {}) {
			const list = pen.element(root, 'L');
			lines.forEach((line, index) => {
				const item = pen.element(list, 'LI');
				room(pen.heightOf(body, line, widthPt - 20) + 4);
				const top = yPt;
				const mark = ring ? String(index + 1) : '–';
				pen.mark(pen.element(item, 'Lbl'), 'Lbl', () => label(pen, mark, ring, top));
				flow.block(item, 'LBody', line, body, 20);
				yPt = Math.max(yPt, top + (ring ? 15 : 0)) + 1.5;
			});
		},
		table(
			heads: readonly string[],
			rows: readonly (readonly string[])[],
			sharesOf: readonly number[]
		) {
			const table = pen.element(root, 'Table');
			const head: Style = { font: 'label', sizePt: 7.5, colour: colour.soft, spacingPt: 0.4 };
			const row = (cells: readonly string[], tag: 'TH' | 'TD', style: Style) => {
				const widths = sharesOf.map((share) => share * widthPt - 8);
				const heights = cells.map((cell, c) => pen.heightOf(style, cell, widths[c] ?? 0));
				room(Math.max(...heights) + 7);
				const line = pen.element(table, 'TR');
				let xPt: number = paper.leftPt;
				cells.forEach((cell, c) => {
					const scope = tag === 'TH' ? { scope: 'Column' } : {};
					pen.mark(pen.element(line, tag, scope), tag, () => {
						if (cell) pen.write(style, cell, xPt, yPt + 3, widths[c] ?? 0);
					});
					xPt += (sharesOf[c] ?? 0) * widthPt;
				});
				yPt += Math.max(...heights) + 7;
				rule(pen, yPt, tag === 'TH' ? colour.ink : colour.rule);
			};
			row(
				heads.map((one) => one.toUpperCase()),
				'TH',
				head
			);
			for (const cells of rows) row(cells, 'TD', body);
		}
	};
	return flow;
}

function rule({ artifact, doc }: Pen, yPt: number, stroke: string): void {
	artifact(() => {
		doc.lineWidth(stroke === colour.ink ? 1 : 0.6);
		doc.moveTo(paper.leftPt, yPt).lineTo(paper.rightPt, yPt).stroke(stroke);
	});
}

function label({ doc, write, heightOf }: Pen, text: string, ring: boolean, yPt: number): void {
	if (!ring) {
		write(body, text, paper.leftPt + 4, yPt, 12);
		return;
	}
	const style: Style = { font: 'figure', sizePt: 7.5 };
	doc
		.lineWidth(0.9)
		.circle(paper.leftPt + 7, yPt + 6.5, 6.5)
		.stroke(colour.ink);
	const halfPt = doc.font('figure').fontSize(7.5).widthOfString(text) / 2;
	write(style, text, paper.leftPt + 7 - halfPt, yPt + 6.5 - heightOf(style, text, 20) / 2, 20);
}
