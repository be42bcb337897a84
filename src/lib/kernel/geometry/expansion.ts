import { cannot, computed, type Outcome } from '../outcome';

/** A material and its linear expansion near room temperature. */
export type Material = {
	key: string;
	words: string;
	/** A kelvin. */
	perK: number;
	source: string;
};

/** How far alloys of one name lie apart from a table's value, as a part of it. */
export const alloysDifferBy = 0.1;

const firstTable = 'engineering table, coefficients of linear thermal expansion';
const secondTable = 'engineering table, coefficient of linear thermal expansion, 1e-6 in/in °F';
const thirdTable = 'engineering table, coefficients of thermal expansion';

/** Published coefficients, those of engines and of what measures them. */
export const materials = [
	{ key: 'steel', words: 'Steel', perK: 12e-6, source: thirdTable },
	{
		key: 'gauge-steel',
		words: 'Steel of gauges and micrometers',
		perK: 11.5e-6,
		source: 'ISO 3650:1998, steel gauge blocks, (11.5 ± 1.0)e-6 a kelvin'
	},
	{ key: 'cast-iron', words: 'Grey cast iron', perK: 10.8e-6, source: firstTable },
	{ key: 'aluminium', words: 'Aluminium alloy, cast or wrought', perK: 23e-6, source: thirdTable },
	{
		key: 'piston-alloy',
		words: 'Piston alloy, about 12 % silicon',
		perK: 20e-6,
		source: 'handbook value'
	},
	{ key: 'brass', words: 'Brass', perK: 18.7e-6, source: secondTable },
	{ key: 'bronze', words: 'Bronze', perK: 18e-6, source: thirdTable },
	{ key: 'copper', words: 'Copper', perK: 17.6e-6, source: secondTable },
	{ key: 'stainless', words: 'Austenitic steel', perK: 17e-6, source: thirdTable },
	{ key: 'titanium', words: 'Titanium', perK: 8.6e-6, source: thirdTable }
] as const satisfies readonly Material[];
export type MaterialKey = (typeof materials)[number]['key'];

/** @throws RangeError where there is no such material */
export function expansionPerK(key: MaterialKey): number {
	const found = materials.find((one) => one.key === key);
	if (!found) throw new RangeError(`no material ${key}`);
	return found.perK;
}

/**
 * A coefficient a kelvin as tables of the inch system print it, a degree Fahrenheit.
 *
 * Formula: αF = αK / 1.8.
 * @param perK a kelvin, zero or more
 * @returns a degree Fahrenheit
 * Source: NIST SP 811 (2008), B.8: a difference of 1 °F is 1/1.8 K.
 * @example perFahrenheit(10.8e-6) // 6.0e-6
 */
export function perFahrenheit(perK: number): Outcome<number> {
	return perK >= 0 && perK < 1 ? computed(perK / 1.8) : cannot('an expansion is zero or more');
}
