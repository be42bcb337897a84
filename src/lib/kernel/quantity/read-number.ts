import { cannot, computed, type Outcome } from '../outcome';

/** Units in which nobody has a thousand of anything on this bench, so a comma is a decimal mark. */
const neverThousands = ['mm', 'cm', 'm', 'in'];

/**
 * A bare figure as a person types it: comma or point as the one decimal mark, spaces between
 * groups of three, a sign of any shape.
 *
 * @param typed the figure alone
 * @param unit what it is of: "1,250" is a thousand psi to one person and one to another, and
 *   neither to somebody who measures millimetres
 * @returns the number; "cannot" with the reason, also where it could be read in two ways
 * @example readNumber('74,012', 'mm') // 74.012
 */
export function readNumber(typed: string, unit = ''): Outcome<number> {
	const text = typed
		.trim()
		.replace(/[\u2212\u2013]/g, '-')
		.replace(/[\u00a0\u202f]/g, ' ')
		.replace(/^([+-])\s+/, '$1');
	if (!/\d/.test(text)) return cannot('there is no number in it');
	if (!/^[+-]?[\d.,\s]+$/.test(text)) return cannot('it is more than a figure');
	if (/\s/.test(text) && !/^[+-]?\d{1,3}(\s\d{3})+([.,]\d+)?$/.test(text))
		return cannot('there is more than one number in it');
	const digits = text.replace(/\s/g, '');
	if ((digits.match(/[.,]/g) ?? []).length > 1)
		return cannot('it can be read in two ways: write one decimal mark only');
	if (/^[+-]?[1-9]\d{0,2},\d{3}$/.test(digits) && !neverThousands.includes(unit))
		return cannot(
			`it can be read in two ways: write ${digits.replace(',', '')} or ${digits.replace(',', '.')}`
		);
	const value = Number(digits.replace(',', '.'));
	return Number.isFinite(value) ? computed(value) : cannot('the number is too large');
}
