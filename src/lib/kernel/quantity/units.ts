/**
 * Factors to the unit used inside (mm, N·m, N, MPa, cm³, °, °C, kW, m/s). Exact wherever the definition
 * makes it so.
 * Source: NIST SP 811 (2008), appendix B.8 and B.9; inch 25.4 mm, pound 0.45359237 kg, standard
 * gravity 9.80665 m/s², US gallon 231 in³ and the conventional mercury of 13 595.1 kg/m³ are exact
 * by definition.
 */
const poundForceN = 0.45359237 * 9.80665;

/** A scale with a zero of its own: inside = value · factor + offset. */
export type Affine = { factor: number; offset: number };

export const lengthMm = { mm: 1, cm: 10, m: 1000, µm: 0.001, in: 25.4, thou: 0.0254 } as const;
export const torqueNm = {
	'N·m': 1,
	'lbf·ft': poundForceN * 0.3048,
	'lbf·in': poundForceN * 0.0254,
	'kgf·m': 9.80665,
	'kgf·cm': 0.0980665
} as const;
export const forceN = { N: 1, kN: 1000, lbf: poundForceN, kgf: 9.80665 } as const;
export const pressureMPa = {
	MPa: 1,
	kPa: 0.001,
	bar: 0.1,
	psi: poundForceN / 25.4 ** 2,
	'kgf/cm²': 0.0980665,
	inHg: 13_595.1 * 9.80665 * 0.0254 * 1e-6,
	mmHg: 13_595.1 * 9.80665 * 1e-9
} as const;
export const volumeCm3 = {
	'cm³': 1,
	'mm³': 0.001,
	L: 1000,
	'm³': 1e6,
	'in³': 16.387064,
	'ft³': 28_316.846592,
	'US qt': 231 * 16.387064 * 0.25,
	'US gal': 231 * 16.387064
} as const;
export const angleDeg = { '°': 1, rad: 180 / Math.PI, turn: 360 } as const;
/** A reading of a thermometer. The difference of two is a `temperatureDifference`. */
export const temperatureC = {
	'°C': { factor: 1, offset: 0 },
	'°F': { factor: 5 / 9, offset: -160 / 9 },
	K: { factor: 1, offset: -273.15 }
} as const satisfies Record<string, Affine>;
export const temperatureDifferenceK = { K: 1, '°C': 1, '°F': 5 / 9 } as const;
/** hp is 550 foot-pounds-force a second, PS 75 metre-kilograms-force a second. */
export const powerKw = {
	kW: 1,
	W: 0.001,
	hp: (550 * 0.3048 * poundForceN) / 1000,
	PS: (75 * 9.80665) / 1000
} as const;

/** Of a piston: the inch trade writes it a minute. */
export const speedMPerS = { 'm/s': 1, 'ft/min': 0.3048 / 60, 'ft/s': 0.3048 } as const;

export const dimensions = {
	length: lengthMm,
	torque: torqueNm,
	force: forceN,
	pressure: pressureMPa,
	volume: volumeCm3,
	angle: angleDeg,
	temperature: temperatureC,
	temperatureDifference: temperatureDifferenceK,
	power: powerKw,
	speed: speedMPerS
} as const;
export type DimensionName = keyof typeof dimensions;
export type UnitOf<D extends DimensionName> = keyof (typeof dimensions)[D] & string;

/**
 * How a unit lies to the one used inside: inside = value · factor + offset.
 *
 * @throws RangeError where the unit is of another dimension
 * @example scaleOf('temperature', '°F') // { factor: 0.5556, offset: −17.78 }
 */
export function scaleOf(dimension: DimensionName, unit: string): Affine {
	const scale = (dimensions[dimension] as Record<string, number | Affine>)[unit];
	if (scale === undefined) throw new RangeError(`${unit} is no unit of ${dimension}`);
	return typeof scale === 'number' ? { factor: scale, offset: 0 } : scale;
}

/**
 * Converts between two units of one dimension.
 *
 * Formula: (x · f(from) + z(from) − z(to)) / f(to), with the factors above and z zero for all but
 * readings of a thermometer.
 * @throws RangeError where the value is no number or a unit is of another dimension
 * Source: as the factors.
 * @example convert('torque', 18, 'lbf·ft', 'N·m') // 24.405
 */
export function convert<D extends DimensionName>(
	dimension: D,
	value: number,
	from: UnitOf<D>,
	to: UnitOf<D>
): number {
	const [a, b] = [scaleOf(dimension, from), scaleOf(dimension, to)];
	const converted = (value * a.factor + (a.offset - b.offset)) / b.factor;
	if (!Number.isFinite(converted)) throw new RangeError(`no conversion from ${from} to ${to}`);
	return converted;
}
