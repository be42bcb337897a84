import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { runout } from '$lib/domain/crib/calculators/runout';
import { figureOf, refusalOf, workedOf } from './typed';

describe('runout around a turn', () => {
	it('works its example', () => {
		const worked = workedOf(runout);
		// 0.036 less −0.004
		expect(figureOf(worked, 'runout')).toBeCloseTo(0.04, 6);
		expect(figureOf(worked, 'half')).toBeCloseTo(0.02, 6);
		// a = (2/8)(−0.033 − 0.049/√2), b = (2/8)(0.025 + 0.031/√2)
		expect(worked.working[2]?.value).toBeCloseTo((-0.033 - 0.049 / Math.SQRT2) / 4, 6);
		expect(worked.working[3]?.value).toBeCloseTo((0.025 + 0.031 / Math.SQRT2) / 4, 6);
		expect(figureOf(worked, 'eccentricity')).toBeCloseTo(0.02058, 5);
		expect(worked.rulings?.map((one) => one.ruling.ruling)).toEqual(['out', 'within']);
		expect(worked.notes?.join(' ')).toContain('vee blocks');
	});
	it('G08 0, 0.003, −0.002 and 0.003 in are 0.005 in of runout (TM 10-3930-664-24, p. 3-41)', () => {
		const worked = workedOf(
			runout,
			{
				readings: '_0*_0.003*_-0.002*_0.003',
				buildMost: '',
				runMost: '0.008',
				uncertainty: '0.0005'
			},
			'inch'
		);
		expect(figureOf(worked, 'runout') / 25.4).toBeCloseTo(0.005, 6);
		expect(worked.rulings?.[0]?.ruling.ruling).toBe('within');
		expect(worked.notes?.at(-1)).toContain('eight or more');
	});
	it('G07 0.06 mm of runout is 0.03 mm of bend (TM 10-3930-653-14&P, fig 4-62)', () => {
		const worked = workedOf(runout, { readings: '_0.03*_0*_-0.03*_0', support: 'centres' });
		expect(figureOf(worked, 'half')).toBeCloseTo(0.03, 9);
		expect(figureOf(worked, 'eccentricity')).toBeCloseTo(0.03, 6);
		expect(figureOf(worked, 'high')).toBeCloseTo(0, 6);
	});
	it('takes uneven angles, and refuses some without others', () => {
		const worked = workedOf(runout, { readings: '0_0.02*100_0*180_-0.02*260_0' });
		expect(figureOf(worked, 'runout')).toBe(0.04);
		expect(worked.working[2]?.words).toContain('least squares');
		expect(refusalOf(runout, { readings: '0_0*90_0.01*_0.02*270_0' })).toContain('reading 3');
		expect(refusalOf(runout, { readings: '0_0*10_0.01*20_0.02*30_0' })).toContain('all the way');
		expect(refusalOf(runout, { readings: '_0*_0.01*_0.02' })).toContain('at least four');
	});
	it('takes its limits from a data sheet', () => {
		const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
		if (!sheet) throw new Error('the data sheet is gone');
		expect(runout.presets?.(sheet)[0]).toMatchObject({
			key: 'crankshaft.runout',
			values: { buildMost: '0.03', runMost: '0.05' }
		});
	});
});
