/**
 * Factors to the unit used inside (mm, N·m, N, MPa). Exact wherever the definition makes it so.
 * Source: NIST SP 811 (2008), appendix B.8 and B.9; inch 25.4 mm, pound 0.45359237 kg and standard
 * gravity 9.80665 m/s² are exact by definition.
 */
const poundForceN = 0.45359237 * 9.80665;

export const lengthMm = { mm: 1, µm: 0.001, in: 25.4, thou: 0.0254 } as const;
export const torqueNm = {
	'N·m': 1,
	'lbf·ft': poundForceN * 0.3048,
	'lbf·in': poundForceN * 0.0254,
	'kgf·m': 9.80665
} as const;
export const forceN = { N: 1, kN: 1000, lbf: poundForceN, kgf: 9.80665 } as const;
export const pressureMPa = {
	MPa: 1,
	kPa: 0.001,
	bar: 0.1,
	psi: poundForceN / 25.4 ** 2
} as const;

export const dimensions = {
	length: lengthMm,
	torque: torqueNm,
	force: forceN,
	pressure: pressureMPa
} as const;
export type DimensionName = keyof typeof dimensions;
export type UnitOf<D extends DimensionName> = keyof (typeof dimensions)[D] & string;

/**
 * Converts between two units of one dimension.
 *
 * Formula: x · f(from) / f(to), with the factors above.
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
	const factors = dimensions[dimension] as unknown as Record<string, number>;
	const [a, b] = [factors[from], factors[to]];
	const converted = a === undefined || b === undefined ? Number.NaN : (value * a) / b;
	if (!Number.isFinite(converted)) throw new RangeError(`no conversion from ${from} to ${to}`);
	return converted;
}
