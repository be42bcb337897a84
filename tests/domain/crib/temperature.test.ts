import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { temperature } from '$lib/domain/crib/calculators/temperature';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { figureOf, typed, workedOf } from './typed';

describe('a reading brought to 20 °C', () => {
	it('works its example: a warm piston under a steel micrometer', () => {
		const worked = workedOf(temperature);
		// 73.985 · 23e-6 · 14 and 73.985 · 11.5e-6 · 4
		expect(worked.working[0]?.value).toBeCloseTo(0.02382, 5);
		expect(worked.working[1]?.value).toBeCloseTo(0.0034, 5);
		expect(figureOf(worked, 'correction')).toBeCloseTo(-0.02042, 5);
		expect(figureOf(worked, 'at-20')).toBeCloseTo(73.96458, 5);
		// Read as it was it would have been too large to build.
		expect(worked.rulings?.[0]?.ruling.ruling).toBe('too-close');
		expect(figureOf(worked, 'most')).toBeCloseTo(73.975 + 0.02042, 3);
	});
	it('changes hardly anything for steel under steel, and says so', () => {
		const steel = {
			part: 'steel',
			partC: '30',
			instrumentC: '30',
			reading: '40',
			least: '',
			most: ''
		};
		const worked = workedOf(temperature, steel);
		expect(Math.abs(figureOf(worked, 'correction'))).toBeLessThan(0.0005);
		expect(worked.notes?.join(' ')).toContain('changes nothing');
		expect(worked.rulings).toEqual([]);
	});
	it('E22 80 mm of piston alloy in iron, 60 K warmer, part by 0.0442 mm (dL = α·L·ΔT)', () => {
		const worked = workedOf(temperature, {
			reading: '80',
			part: 'piston-alloy',
			partC: '80',
			instrument: 'cast-iron',
			instrumentC: '80',
			least: '',
			most: ''
		});
		expect(figureOf(worked, 'correction')).toBeCloseTo(-0.0442, 4);
	});
	it('takes the part’s own expansion before the table’s, and degrees Fahrenheit', () => {
		const own = workedOf(temperature, { ownPerK: '0' });
		expect(own.working[0]?.value).toBe(0);
		const warm = typed(temperature, { partC: '93.2 °F', instrumentC: '75.2 °F' });
		if (!warm.worked?.ok) throw new Error('not worked');
		expect(figureOf(warm.worked.value, 'at-20')).toBeCloseTo(73.96458, 5);
	});
	it('grows less sure with the thermometer', () => {
		const sure = figureOf(workedOf(temperature, { within: '0' }), 'expanded');
		const unsure = figureOf(workedOf(temperature, { within: '3' }), 'expanded');
		expect(unsure).toBeGreaterThan(sure);
	});
	it('takes printed sizes from a data sheet, and its expansion where one is given', () => {
		const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
		if (!sheet) throw new Error('the data sheet is gone');
		const known = dataSheetSchema.parse({
			...sheet,
			partFamilies: sheet.partFamilies.map((one) =>
				one.key === 'piston' ? { ...one, expansionPerK: 20.5e-6 } : one
			)
		});
		const presets = temperature.presets?.(known) ?? [];
		expect(presets.find((one) => one.key === 'piston.diameter')?.values).toEqual({
			least: '73.96',
			most: '73.975',
			ownPerK: '20.5'
		});
		expect(presets.map((one) => one.key)).toContain('cylinder.bore');
		expect(presets.map((one) => one.key)).not.toContain('crankpin.oilClearance');
		expect(presets.map((one) => one.key)).not.toContain('head.flatness');
	});
});
