import { cannot, computed, type Outcome } from '../outcome';
import { spellings } from './spellings';
import { dimensions, type DimensionName } from './units';

export type Quantity = { value: number; unit: string };

/** Units in which nobody has a thousand of anything on this bench, so a comma is a decimal mark. */
const neverThousands = ['mm', 'in'];

/**
 * A value with its unit as a person types it: "0,045 mm", "1.5 thou", "18 ft-lb".
 *
 * @param typed comma or point as the one decimal mark, spaces between groups of three
 * @param fallback the unit meant when none is typed; without one, a bare number is refused
 * @returns value and unit as typed, not converted; "cannot" with the reason, also where it could
 *   mean two things: "1,250 psi", "1,234.5 mm", "40.01 40.02"
 * @example parseQuantity('18 ft-lb', 'torque') // { value: 18, unit: 'lbf·ft' }
 */
export function parseQuantity(
	typed: string,
	dimension: DimensionName,
	fallback?: string
): Outcome<Quantity> {
	const found = /^([+-]?\s*[\d.,\s]*\d)\s*(.*)$/s.exec(
		typed.trim().replace(/[\u2212\u2013]/g, '-')
	);
	if (!found) return cannot('there is no number in it');
	const words = (found[2] ?? '').trim();
	if (/^\/\s*\d/.test(words)) return cannot('write the fraction as a decimal, such as 0.375');
	const unit = words === '' ? fallback : unitIn(words, dimension);
	if (!unit)
		return cannot(
			words === ''
				? 'say the unit as well'
				: `“${words}” is no unit of ${dimension}: use ${Object.keys(dimensions[dimension]).join(', ')}`
		);
	const value = numberIn(found[1] ?? '', unit);
	return value.ok ? computed({ value: value.value, unit }) : value;
}

function unitIn(words: string, dimension: DimensionName): string | undefined {
	return spellings[dimension].find(([pattern]) => pattern.test(words))?.[1];
}

function numberIn(written: string, unit: string): Outcome<number> {
	const text = written.replace(/^([+-])\s+/, '$1');
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
