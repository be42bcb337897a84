import { describe, expect, it } from 'vitest';
import { rod } from '$lib/domain/crib/calculators/rod';
import { figureOf, refusalOf, workedOf } from './typed';

describe('bend and twist of a rod', () => {
	it('works its example: 0.03 and 0.06 mm over 120 mm', () => {
		const worked = workedOf(rod);
		expect(figureOf(worked, 'bend')).toBeCloseTo(0.025, 6);
		expect(figureOf(worked, 'twist')).toBeCloseTo(0.05, 6);
		// 170.52 less half of 43.02 and 18.00
		expect(figureOf(worked, 'length')).toBeCloseTo(140.01, 6);
		expect(worked.lines.map((one) => one.words)).toContain('Twist in 100 mm, near side high');
		expect(worked.working[0]?.formula).toBe('|(0.030 − 0.000) / 120 · 100|');
		// 0.01 · 100/120 · √2
		expect(worked.rulings?.[0]?.expandedUncertainty).toBeCloseTo(0.01179, 5);
	});
	it('takes off what the big end’s mandrel leans', () => {
		const worked = workedOf(rod, { readings: '0_0.03*0_0.03*0_-0.06*0_0.06' });
		expect(figureOf(worked, 'bend')).toBe(0);
		expect(figureOf(worked, 'twist')).toBeCloseTo(0.1, 6);
		const wider = workedOf(rod, { readings: '0_0.03*0_0.03*0_0*_', bigApart: '60' });
		expect(figureOf(wider, 'bend')).toBeCloseTo(0.025, 6);
	});
	it('L37 0.001 in per in of width is what 0.1 mm in 100 mm is (TM 9-2815-220-24, WP 0143)', () => {
		const worked = workedOf(
			rod,
			{ readings: '0_0.004*_*0_0.004*_', apart: '4', over: '', bigMandrel: '', smallMandrel: '' },
			'inch'
		);
		expect(figureOf(worked, 'bend')).toBeCloseTo(0.1, 6);
	});
	it('refuses half a mandrel, and a rod that far out of line', () => {
		expect(refusalOf(rod, { readings: '0_*_*0_0*_' })).toContain('Bend, small end');
		expect(refusalOf(rod, { readings: '0_0.03*0_*0_0*_' })).toContain('Bend, big end');
		expect(refusalOf(rod, { readings: '0_20*_*0_0*_' })).toContain('no rod stands');
		expect(refusalOf(rod, { over: '50' })).toContain('larger than both');
	});
});
