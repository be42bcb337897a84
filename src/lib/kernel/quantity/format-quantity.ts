/**
 * A value as it is printed beside an instrument of a given resolution: to a whole number of its
 * steps, halves away from zero, with as many decimals as the step has, and a true minus sign.
 *
 * @param value in the unit @param unit as printed, may be empty
 * @param resolution the step, above zero: a least count such as 0.01 or 0.002
 * @throws RangeError where a value is no number
 * Source: ISO 80000-1:2009, annex B (rounding to a range; rule B for halves) and 7.1.4 (the space).
 * @example formatQuantity(40.0364, 'mm', 0.002) // '40.036 mm'
 */
export function formatQuantity(value: number, unit: string, resolution: number): string {
	if (!(resolution > 0)) throw new RangeError('a resolution is above zero');
	// Twelve digits: 1.005 / 0.01 must count as a half, not as binary dust below it.
	const steps = Math.round(Number((Math.abs(value) / resolution).toPrecision(12)));
	const size = steps * resolution;
	if (!Number.isFinite(size)) throw new RangeError('that is no number to print');
	const printed = `${value < 0 && steps > 0 ? '−' : ''}${size.toFixed(decimalsOf(resolution))}`;
	if (unit === '°') return `${printed}°`;
	return unit ? `${printed} ${unit}` : printed;
}

/** Decimals of a step: 2 for 0.05, 0 for 5. At most 20, which is far below any instrument. */
function decimalsOf(step: number): number {
	const [digits = '', power = '0'] = String(step).split('e');
	const written = digits.split('.')[1]?.length ?? 0;
	return Math.min(20, Math.max(0, written - Number(power)));
}
