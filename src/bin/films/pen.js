/** Small pieces of drawing, in the look of the drawing office at night. */
export const brass = '#e6c069';
export const ground = '#10273f';

/** @param {number} x @param {number} y @param {string} words @param {{ size?: number, anchor?: string, fill?: string }} [how] */
export function text(x, y, words, { size = 26, anchor = 'start', fill = '#e9f0f6' } = {}) {
	return `<text x="${x}" y="${y}" font-size="${size}" text-anchor="${anchor}" fill="${fill}" stroke="none">${words}</text>`;
}

/** A call-out: a dot on the part, a leader, and its words. */
/** @param {number} x @param {number} y @param {number} toX @param {number} toY @param {string} words @param {'start' | 'end'} [anchor] */
export function callOut(x, y, toX, toY, words, anchor = 'start') {
	const shift = anchor === 'start' ? 10 : -10;
	return `<path d="M${x} ${y}L${toX} ${toY}" stroke="${brass}"/><circle cx="${x}" cy="${y}" r="4.5" fill="${brass}" stroke="none"/>${text(toX + shift, toY + 8, words, { anchor, fill: brass })}`;
}

/** @param {number} x1 @param {number} y1 @param {number} x2 @param {number} y2 */
export function centreLine(x1, y1, x2, y2) {
	return `<path d="M${x1} ${y1}L${x2} ${y2}" stroke-dasharray="24 6 5 6" stroke-width="1.1"/>`;
}

/** A dimension with arrowheads between two points on one level. @param {number} x1 @param {number} x2 @param {number} y @param {string} words */
export function dimension(x1, x2, y, words) {
	const middle = (x1 + x2) / 2;
	return `<path d="M${x1} ${y}H${x2}M${x1} ${y - 9}v18M${x2} ${y - 9}v18" stroke="${brass}" stroke-width="1.6"/><path d="M${x1} ${y}l12-5v10zM${x2} ${y}l-12-5v10z" fill="${brass}" stroke="none"/><rect x="${middle - 8 * words.length}" y="${y - 16}" width="${16 * words.length}" height="30" fill="${ground}" stroke="none"/>${text(middle, y + 9, words, { anchor: 'middle', fill: brass })}`;
}

/** @param {string} words */
export function heading(words) {
	return text(60, 76, words, { size: 40 });
}

/** @param {number} from @param {number} to @param {number} p */
export function between(from, to, p) {
	return Math.round((from + (to - from) * p) * 10) / 10;
}
