import { computedNumber } from '../computed-number';
import type { Outcome } from '../outcome';
import { stressAreaMm2 } from './stress-area';

export type PropertyClass = '4.6' | '5.8' | '8.8' | '10.9' | '12.9';

const proofStresses = { '4.6': 225, '5.8': 380, '8.8': 580, '10.9': 830, '12.9': 970 } as const;

/**
 * Stress under proof load.
 *
 * @param diameterMm nominal diameter; class 8.8 is stronger above M16
 * @returns N/mm²
 * Source: ISO 898-1:2013, table 3.
 * @example proofStressMPa('10.9', 10) // 830
 */
export function proofStressMPa(propertyClass: PropertyClass, diameterMm: number): number {
	return propertyClass === '8.8' && diameterMm > 16 ? 600 : proofStresses[propertyClass];
}

/**
 * Proof load of a bolt: what it bears and still springs back.
 *
 * Formula: Fp = As · Sp, with As to three significant figures, as the standard's tables have it.
 * @param diameterMm nominal d, mm @param pitchMm pitch P, mm
 * @returns N
 * Source: ISO 898-1:2013, tables 5 and 7.
 * @example proofLoadN(10, 1.25, '10.9') // 50 796
 */
export function proofLoadN(
	diameterMm: number,
	pitchMm: number,
	propertyClass: PropertyClass
): Outcome<number> {
	const area = stressAreaMm2(diameterMm, pitchMm);
	if (!area.ok) return area;
	return computedNumber(
		Number(area.value.toPrecision(3)) * proofStressMPa(propertyClass, diameterMm)
	);
}
