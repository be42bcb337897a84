/**
 * A number as people type it: comma or point, spaces between thousands, a sign. Undefined when it
 * cannot be told what was meant; nothing is guessed from "1.234,5" unless the groups are right.
 */
export function readNumber(typed: string): number | undefined {
	const text = typed.replace(/[\s\u00a0\u202f]/g, '').replace(/^\u2212/, '-');
	const last = Math.max(text.lastIndexOf('.'), text.lastIndexOf(','));
	if (last < 0) return plain(text);
	const mark = text.charAt(last);
	const other = mark === '.' ? ',' : '.';
	const whole = text.slice(0, last);
	if (whole.includes(mark)) return undefined;
	if (whole.includes(other) && !new RegExp(`^[+-]?\\d{1,3}(\\${other}\\d{3})+$`).test(whole))
		return undefined;
	return plain(`${whole.replaceAll(other, '')}.${text.slice(last + 1)}`);
}

function plain(text: string): number | undefined {
	return /^[+-]?(\d+\.?\d*|\.\d+)$/.test(text) ? Number(text) : undefined;
}
