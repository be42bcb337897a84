import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import { tabledAreaMm2, type BoltThread } from './bolt-thread';
import {
	classStrength,
	strengthOf,
	type Grade,
	type PropertyClass,
	type Strength,
	type StrengthName
} from './strength';

export type { PropertyClass };

/**
 * Stress under proof load.
 *
 * @param diameterMm nominal diameter; class 8.8 is stronger above M16
 * @returns N/mm²
 * Source: ISO 898-1:2013, table 3.
 * @example proofStressMPa('10.9', 10) // 830
 */
export function proofStressMPa(propertyClass: PropertyClass, diameterMm: number): number {
	return classStrength(propertyClass, diameterMm).proofMPa;
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
	const loads = boltLoads(diameterMm, pitchMm, propertyClass);
	return loads.ok ? computed(loads.value.proofN) : loads;
}

export type Loads = { areaMm2: number; proofN: number; yieldN: number; tensileN: number };

/**
 * Proof, yield and least tensile load of a metric bolt.
 *
 * Formula: F = As · S, with As to three significant figures and S the proof stress, the yield or
 * 0.2 % proof strength, or the tensile strength of the class.
 * @param diameterMm nominal d, mm @param pitchMm pitch P, mm
 * @returns area in mm², loads in N
 * Source: ISO 898-1:2013, table 3 (stresses), tables 4 to 7 (loads).
 * @example boltLoads(10, 1.5, '10.9') // proof 48 140 N, tensile 60 320 N
 */
export function boltLoads(
	diameterMm: number,
	pitchMm: number,
	propertyClass: PropertyClass
): Outcome<Loads> {
	return threadLoads({ diameterMm, pitchMm }, propertyClass);
}

/**
 * Proof, yield and least tensile load of a unified inch bolt.
 *
 * Formula: F = As · S, with As to four places of a square inch and S of the grade in its size.
 * @param diameterIn inches, 1/4 to 1 1/2 @param threadsPerInch n
 * @returns area in mm², loads in N
 * Source: SAE J429, stresses and loads.
 * @example gradeLoads(0.5, 13, '5') // proof 53 650 N (12 062 lbf)
 */
export function gradeLoads(
	diameterIn: number,
	threadsPerInch: number,
	grade: Grade
): Outcome<Loads> {
	return threadLoads({ diameterMm: diameterIn * 25.4, threadsPerInch }, `SAE ${grade}`);
}

/**
 * Loads of either kind of thread in any class or grade.
 *
 * @param thread sizes in mm, or threads per inch @param strength such as '10.9' or 'SAE 5'
 * @returns area in mm², loads in N; "cannot" outside the sizes of a grade
 * Source: as `boltLoads` and `gradeLoads`.
 * @example threadLoads({ diameterMm: 10, pitchMm: 1.25 }, '10.9') // proof 50 796 N
 */
export function threadLoads(thread: BoltThread, strength: StrengthName): Outcome<Loads> {
	const area = tabledAreaMm2(thread);
	if (!area.ok) return area;
	const stresses = strengthOf(strength, thread.diameterMm);
	return stresses.ok ? loadsOf(area.value, stresses.value) : stresses;
}

/**
 * Loads that a stress area bears.
 *
 * @param areaMm2 mm², above zero @param strength stresses, N/mm²
 * @returns N
 * @example loadsOf(58, { proofMPa: 830, yieldMPa: 940, tensileMPa: 1040 }) // proof 48 140 N
 */
export function loadsOf(areaMm2: number, strength: Strength): Outcome<Loads> {
	if (!(areaMm2 > 0)) return cannot('a stress area is above zero');
	const tensile = computedNumber(areaMm2 * strength.tensileMPa);
	if (!tensile.ok) return tensile;
	return computed({
		areaMm2,
		proofN: areaMm2 * strength.proofMPa,
		yieldN: areaMm2 * strength.yieldMPa,
		tensileN: tensile.value
	});
}
