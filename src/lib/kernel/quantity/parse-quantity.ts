import { cannot, computed, type Outcome } from '../outcome';
import { readNumber } from './read-number';
import { spellings } from './spellings';
import { dimensions, type DimensionName } from './units';

export type Quantity = { value: number; unit: string };

/** Where the trade writes fractions: of an inch, and of a turn. */
const inFractions = ['in', 'turn'];
const fraction = /^([+-]?)\s*(?:(\d+)[\s-]+)?(\d+)\s*[/⁄]\s*(\d+)\s*(.*)$/s;

/**
 * A value with its unit as a person types it: "0,045 mm", "1.5 thou", "18 ft-lb", `1 1/2"`.
 *
 * @param typed comma or point as the one decimal mark, spaces between groups of three; a common
 *   fraction of an inch or of a turn
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
	const text = typed.trim().replace(/[\u2212\u2013]/g, '-');
	const parts = fraction.exec(text);
	if (parts) return fromFraction(parts, dimension, fallback);
	const found = /^([+-]?\s*[\d.,\s]*\d)\s*(.*)$/s.exec(text);
	if (!found) return cannot('there is no number in it');
	const unit = unitIn(found[2] ?? '', dimension, fallback);
	if (!unit.ok) return unit;
	const value = readNumber(found[1] ?? '', unit.value);
	return value.ok ? computed({ value: value.value, unit: unit.value }) : value;
}

function fromFraction(
	parts: RegExpExecArray,
	dimension: DimensionName,
	fallback?: string
): Outcome<Quantity> {
	const [, sign, whole = '0', over = '', under = '', words = ''] = parts;
	const unit = unitIn(words, dimension, fallback);
	if (!unit.ok) return unit;
	if (!inFractions.includes(unit.value))
		return cannot('fractions are read of an inch or a turn only: write a decimal');
	const [n, above, below] = [Number(whole), Number(over), Number(under)];
	if (below === 0) return cannot('nothing can be divided by zero');
	if (n > 0 && above >= below)
		return cannot('it can be read in two ways: the fraction beside a whole number is below one');
	const value = n + above / below;
	if (!Number.isFinite(value)) return cannot('the number is too large');
	return computed({ value: sign === '-' ? -value : value, unit: unit.value });
}

function unitIn(typed: string, dimension: DimensionName, fallback?: string): Outcome<string> {
	const words = typed.trim();
	if (words === '') return fallback ? computed(fallback) : cannot('say the unit as well');
	const found = spellings[dimension].find(([pattern]) => pattern.test(words))?.[1];
	return found
		? computed(found)
		: cannot(
				`“${words}” is no unit of ${dimensionWords[dimension]}: use ${Object.keys(dimensions[dimension]).join(', ')}`
			);
}

const dimensionWords: Record<DimensionName, string> = {
	length: 'length',
	torque: 'torque',
	force: 'force',
	pressure: 'pressure',
	volume: 'volume',
	angle: 'angle',
	temperature: 'temperature',
	temperatureDifference: 'a difference of temperature',
	power: 'power',
	speed: 'speed'
};
