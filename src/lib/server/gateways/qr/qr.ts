import { create } from 'qrcode';

export type QrMatrix = { size: number; dark: (row: number, column: number) => boolean };

/** Quiet zone that the standard (ISO/IEC 18004) asks for, in modules. */
const quiet = 4;

export function qrMatrix(text: string, level: 'L' | 'M' | 'Q' | 'H' = 'M'): QrMatrix {
	const { modules } = create(text, { errorCorrectionLevel: level });
	return { size: modules.size, dark: (row, column) => modules.get(row, column) === 1 };
}

/** One path, drawn in runs, black on white in both themes: readers want dark on light. */
export function qrPath(matrix: QrMatrix): string {
	let path = '';
	for (let row = 0; row < matrix.size; row++)
		for (let column = 0; column < matrix.size; column++) {
			let run = 0;
			while (column + run < matrix.size && matrix.dark(row, column + run)) run++;
			if (run > 0) path += `M${column} ${row}h${run}v1h-${run}z`;
			column += run;
		}
	return path;
}

/** @param says text alternative: what the code leads to */
export function qrSvg(text: string, says: string, level: 'L' | 'M' | 'Q' | 'H' = 'M'): string {
	const matrix = qrMatrix(text, level);
	const side = matrix.size + 2 * quiet;
	return (
		`<svg xmlns="http://www.w3.org/2000/svg" viewBox="${-quiet} ${-quiet} ${side} ${side}" ` +
		`role="img" aria-label="${escaped(says)}" shape-rendering="crispEdges">` +
		`<path d="M${-quiet} ${-quiet}h${side}v${side}h-${side}z" fill="#fff"/>` +
		`<path d="${qrPath(matrix)}" fill="#000"/></svg>`
	);
}

function escaped(text: string): string {
	return text.replace(/[&<>"]/g, (one) => `&#${one.charCodeAt(0)};`);
}
