import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatQuantity } from '$lib/kernel/quantity/format-quantity';
import { parseQuantity } from '$lib/kernel/quantity/parse-quantity';
import { dimensions, type DimensionName } from '$lib/kernel/quantity/units';

describe('a typed quantity', () => {
	it.each([
		['0,045 mm', 'length', 0.045, 'mm'],
		['0.068mm', 'length', 0.068, 'mm'],
		['74,012 mm', 'length', 74.012, 'mm'],
		['−0.02 mm', 'length', -0.02, 'mm'],
		['- 0.02 mm', 'length', -0.02, 'mm'],
		['1.5 thou', 'length', 1.5, 'thou'],
		['.0015"', 'length', 0.0015, 'in'],
		['12 μm', 'length', 12, 'µm'],
		['12 µm', 'length', 12, 'µm'],
		['18 ft-lb', 'torque', 18, 'lbf·ft'],
		['18 lb ft', 'torque', 18, 'lbf·ft'],
		['18 lbf·ft', 'torque', 18, 'lbf·ft'],
		['18 foot pounds', 'torque', 18, 'lbf·ft'],
		['216 in.-lbs', 'torque', 216, 'lbf·in'],
		['1 200 lbf in', 'torque', 1200, 'lbf·in'],
		['35 Nm', 'torque', 35, 'N·m'],
		['35 N·m', 'torque', 35, 'N·m'],
		['3,5 kgf·m', 'torque', 3.5, 'kgf·m'],
		['3.5 mkg', 'torque', 3.5, 'kgf·m'],
		['48.1 kN', 'force', 48.1, 'kN'],
		['12,75 kN', 'force', 12.75, 'kN'],
		['2.5 bar', 'pressure', 2.5, 'bar'],
		['1200 psi', 'pressure', 1200, 'psi'],
		['0,345 MPa', 'pressure', 0.345, 'MPa'],
		['9 kg/cm2', 'pressure', 9, 'kgf/cm²'],
		['18 in Hg', 'pressure', 18, 'inHg'],
		['3/8 in', 'length', 0.375, 'in'],
		['1 1/2 in', 'length', 1.5, 'in'],
		['1-1/2"', 'length', 1.5, 'in'],
		['-1/4 in', 'length', -0.25, 'in'],
		['1/4 turn', 'angle', 0.25, 'turn'],
		['90 deg', 'angle', 90, '°'],
		['48,5 cc', 'volume', 48.5, 'cm³'],
		['2.2 l', 'volume', 2.2, 'L'],
		['350 cu in', 'volume', 350, 'in³'],
		['-5 °C', 'temperature', -5, '°C'],
		['68 F', 'temperature', 68, '°F'],
		['120 hp', 'power', 120, 'hp'],
		['60 PS', 'power', 60, 'PS'],
		['15.4 m/s', 'speed', 15.4, 'm/s'],
		['2 990 fpm', 'speed', 2990, 'ft/min'],
		['49.9 ft/sec', 'speed', 49.9, 'ft/s']
	] as const)('%s is read', (typed, dimension, value, unit) => {
		expect(parseQuantity(typed, dimension)).toEqual({ ok: true, value: { value, unit } });
	});

	it.each([
		['12', 'length', 'say the unit'],
		['', 'length', 'no number'],
		['tight', 'torque', 'no number'],
		['mm 12', 'length', 'no number'],
		['1,234.5 mm', 'length', 'two ways'],
		['1.234,5 mm', 'length', 'two ways'],
		['1..5 mm', 'length', 'two ways'],
		['1,250 psi', 'pressure', 'write 1250 or 1.250'],
		['1,250 µm', 'length', 'write 1250 or 1.250'],
		['40.01 40.02 mm', 'length', 'more than one number'],
		['1 5 mm', 'length', 'more than one number'],
		['40.01 mm 40.02 mm', 'length', 'no unit of length'],
		['3/8 mm', 'length', 'write a decimal'],
		['1 3/2 in', 'length', 'two ways'],
		['3/0 in', 'length', 'divided by zero'],
		['1/2', 'length', 'say the unit'],
		['1/2 psi', 'pressure', 'write a decimal'],
		['12 litres', 'pressure', 'no unit of pressure'],
		['3 gal', 'volume', 'no unit of volume'],
		['18 Nm', 'length', 'no unit of length'],
		['18 lb', 'torque', 'no unit of torque'],
		['1e3 mm', 'length', 'no unit of length'],
		['40.0x mm', 'length', 'no unit of length'],
		[`${'9'.repeat(400)} mm`, 'length', 'too large']
	] as const)('%s is refused with the reason', (typed, dimension, because) => {
		const found = parseQuantity(typed, dimension);
		expect(found.ok).toBe(false);
		expect(found.ok ? '' : found.because).toContain(because);
	});

	it('takes the unit of its field where none is typed, and the typed one where there is', () => {
		expect(parseQuantity('0,045', 'length', 'mm')).toEqual({
			ok: true,
			value: { value: 0.045, unit: 'mm' }
		});
		expect(parseQuantity('1.5 thou', 'length', 'mm')).toEqual({
			ok: true,
			value: { value: 1.5, unit: 'thou' }
		});
		expect(parseQuantity('1,250', 'pressure', 'psi').ok).toBe(false);
	});

	it('is a finite number or a reason, whatever is typed', () => {
		const typed = fc.oneof(
			fc.string(),
			fc.string({ unit: fc.constantFrom(...'0123456789.,+- /mN·"'.split('')) })
		);
		fc.assert(
			fc.property(typed, fc.constantFrom<DimensionName>('length', 'torque'), (text, dimension) => {
				const found = parseQuantity(text, dimension);
				expect(found.ok ? Number.isFinite(found.value.value) : found.because !== '').toBe(true);
			}),
			{ numRuns: 1000 }
		);
	});
});

describe('a printed quantity', () => {
	it.each([
		[40.0364, 'mm', 0.002, '40.036 mm'],
		[40.0374, 'mm', 0.002, '40.038 mm'],
		[1.005, 'mm', 0.01, '1.01 mm'],
		[0.125, 'mm', 0.05, '0.15 mm'],
		[-0.02, 'mm', 0.01, '−0.02 mm'],
		[-0.004, 'mm', 0.01, '0.00 mm'],
		[27_778, 'N', 500, '28000 N'],
		[0.00006, 'mm', 1e-5, '0.00006 mm'],
		[3e-7, 'mm', 1e-7, '0.0000003 mm'],
		[90, '°', 1, '90°'],
		[12, '', 1, '12']
	])('%s %s in steps of %s is %s', (value, unit, resolution, printed) => {
		expect(formatQuantity(value, unit, resolution)).toBe(printed);
	});
	it('is read back as what was printed, within half a step', () => {
		const units = (Object.keys(dimensions) as DimensionName[]).flatMap((dimension) =>
			Object.keys(dimensions[dimension]).map((unit) => [dimension, unit] as const)
		);
		fc.assert(
			fc.property(
				fc.double({ min: -9000, max: 9000, noNaN: true }),
				fc.constantFrom(...units),
				fc.constantFrom(1, 0.5, 0.1, 0.05, 0.02, 0.01, 0.002, 0.001),
				(value, [dimension, unit], resolution) => {
					const found = parseQuantity(formatQuantity(value, unit, resolution), dimension);
					if (!found.ok) throw new Error(found.because);
					expect(found.value.unit).toBe(unit);
					expect(Math.abs(found.value.value - value)).toBeLessThanOrEqual(resolution * 0.5000001);
				}
			)
		);
	});
	it('is refused where it is no number', () => {
		expect(() => formatQuantity(Number.NaN, 'mm', 0.01)).toThrow(RangeError);
		expect(() => formatQuantity(Infinity, 'mm', 0.01)).toThrow(RangeError);
		expect(() => formatQuantity(1, 'mm', 0)).toThrow(RangeError);
	});
});
