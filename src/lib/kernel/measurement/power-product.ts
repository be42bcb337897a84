import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';

export type Factor = { value: number; standard: number; power: number };

/**
 * A product, ratio or power of measured values with its standard uncertainty: a cylinder's
 * volume from bore and stroke, a compression ratio.
 *
 * Formula: y = Π xᵢ^pᵢ; (u / y)² = Σ (pᵢ uᵢ / xᵢ)².
 * @param factors value other than zero, its standard uncertainty, and its power (−1 divides)
 * @returns value and standard uncertainty; "cannot" for a zero or what gives no number
 * Source: JCGM 100:2008 (GUM), 5.1.6.
 * @example ofPowerProduct([{ value: 10, standard: 0.1, power: 1 },
 *   { value: 2, standard: 0.02, power: -1 }]) // 5 with u = 0.0707
 */
export function ofPowerProduct(
	factors: readonly Factor[]
): Outcome<{ value: number; standard: number }> {
	if (factors.length === 0) return cannot('there is nothing to multiply');
	if (factors.some(({ value }) => value === 0))
		return cannot('a value of zero has no relative uncertainty');
	if (!factors.every(({ standard }) => standard >= 0))
		return cannot('an uncertainty is a number, zero or more');
	const value = computedNumber(factors.reduce((all, { value: x, power }) => all * x ** power, 1));
	if (!value.ok) return value;
	const relative = Math.hypot(
		...factors.map(({ value: x, standard, power }) => (power * standard) / x)
	);
	const standard = computedNumber(Math.abs(value.value) * relative);
	return standard.ok ? computed({ value: value.value, standard: standard.value }) : standard;
}
