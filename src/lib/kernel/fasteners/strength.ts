import { cannot, computed, type Outcome } from '../outcome';

export type PropertyClass = '4.6' | '4.8' | '5.6' | '5.8' | '6.8' | '8.8' | '9.8' | '10.9' | '12.9';
export type Grade = '1' | '2' | '5' | '7' | '8';
/** A class or a grade, as a head is marked or a sheet names it. */
export type StrengthName = PropertyClass | `SAE ${Grade}`;

/** Least values, N/mm². Yield is the lower yield stress or the 0.2 % proof strength, whichever the class states. */
export type Strength = { proofMPa: number; yieldMPa: number; tensileMPa: number };

const of = (proofMPa: number, yieldMPa: number, tensileMPa: number): Strength => ({
	proofMPa,
	yieldMPa,
	tensileMPa
});

/**
 * Source: ISO 898-1:2013, table 3. Classes 4.8, 5.6, 6.8 and 9.8 from memory of that table; the
 * others are held to the reference values.
 */
const classes: Readonly<Record<PropertyClass, Strength>> = {
	'4.6': of(225, 240, 400),
	'4.8': of(310, 340, 420),
	'5.6': of(280, 300, 500),
	'5.8': of(380, 420, 520),
	'6.8': of(440, 480, 600),
	'8.8': of(580, 640, 800),
	'9.8': of(650, 720, 900),
	'10.9': of(830, 940, 1040),
	'12.9': of(970, 1100, 1220)
};
const eightEightAbove16 = of(600, 660, 830);

/**
 * Strength of a property class.
 *
 * @param diameterMm nominal diameter; class 8.8 is stronger above M16
 * @returns proof stress, yield and tensile strength, N/mm²
 * Source: ISO 898-1:2013, table 3.
 * @example classStrength('10.9', 10).proofMPa // 830
 */
export function classStrength(propertyClass: PropertyClass, diameterMm: number): Strength {
	return propertyClass === '8.8' && diameterMm > 16 ? eightEightAbove16 : classes[propertyClass];
}

export const propertyClasses = Object.keys(classes) as PropertyClass[];

/** Thousand pounds-force a square inch in N/mm². */
const ksi = (0.45359237 * 9.80665 * 1000) / 25.4 ** 2;
type Sized = { uptoIn: number; ksi: [number, number, number] };
const grades: Readonly<Record<Grade, readonly Sized[]>> = {
	'1': [{ uptoIn: 1.5, ksi: [33, 36, 60] }],
	'2': [
		{ uptoIn: 0.75, ksi: [55, 57, 74] },
		{ uptoIn: 1.5, ksi: [33, 36, 60] }
	],
	'5': [
		{ uptoIn: 1, ksi: [85, 92, 120] },
		{ uptoIn: 1.5, ksi: [74, 81, 105] }
	],
	'7': [{ uptoIn: 1.5, ksi: [105, 115, 133] }],
	'8': [{ uptoIn: 1.5, ksi: [120, 130, 150] }]
};

/**
 * Strength of an SAE grade.
 *
 * @param diameterIn nominal diameter, 1/4 to 1 1/2 inches: grades are weaker in large sizes
 * @returns proof stress, yield and tensile strength, N/mm²; "cannot" outside the sizes of the grade
 * Source: SAE J429, mechanical requirements; grade 7, of older editions, as textbooks reprint it.
 * @example gradeStrength('5', 0.5) // proof 586 N/mm² (85 ksi)
 */
export function gradeStrength(grade: Grade, diameterIn: number): Outcome<Strength> {
	if (!(diameterIn >= 0.25)) return cannot('the grades begin at 1/4 inch');
	const found = grades[grade].find((one) => diameterIn <= one.uptoIn);
	if (!found) return cannot('the grades end at 1 1/2 inches');
	const [proof, least, tensile] = found.ksi;
	return computed(of(proof * ksi, least * ksi, tensile * ksi));
}

export const strengthNames: readonly StrengthName[] = [
	...propertyClasses,
	...(Object.keys(grades) as Grade[]).map((grade): StrengthName => `SAE ${grade}`)
];

/**
 * Strength of a class or a grade.
 *
 * @param name such as '10.9' or 'SAE 5' @param diameterMm nominal diameter, mm
 * @returns N/mm²; "cannot" outside the sizes of a grade
 * Source: as `classStrength` and `gradeStrength`.
 * @example strengthOf('SAE 5', 12.7) // proof 586 N/mm²
 */
export function strengthOf(name: StrengthName, diameterMm: number): Outcome<Strength> {
	if (!(diameterMm > 0)) return cannot('a diameter is a number above zero');
	if (!name.startsWith('SAE ')) return computed(classStrength(name as PropertyClass, diameterMm));
	// Inches that came through millimetres carry binary dust: 1/4 must stay 1/4.
	return gradeStrength(name.slice(4) as Grade, Number((diameterMm / 25.4).toFixed(6)));
}
