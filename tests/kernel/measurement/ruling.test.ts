import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ruleReading, type RulingName } from '$lib/kernel/measurement/ruling';
import {
	expandedMm,
	ofDifferenceMm,
	standardUncertaintyMm
} from '$lib/kernel/measurement/uncertainty';

const rule = (
	value: number,
	expandedUncertainty: number,
	limits: { least?: number; most?: number }
) => {
	const found = ruleReading({ question: 'run-again', value, expandedUncertainty, ...limits });
	if (!found.ok) throw new Error(found.because);
	return found.value.ruling;
};

describe('a ruling by ISO 14253-1, guard band U on both sides', () => {
	// The zones of the standard's figure 1 for an upper limit, worked by hand.
	it.each<[number, RulingName]>([
		[0.065, 'within'],
		[0.0651, 'too-close'],
		[0.07, 'too-close'],
		[0.075, 'too-close'],
		[0.0751, 'out']
	])('%s mm against at most 0.070 with U = 0.005 is %s', (value, wanted) => {
		expect(rule(value, 0.005, { most: 0.07 })).toBe(wanted);
	});
	it('is the same seen from below', () => {
		fc.assert(
			fc.property(fc.integer({ min: -200, max: 200 }), (off) => {
				const value = off / 1000;
				expect(rule(value, 0.005, { most: 0.05 })).toBe(rule(-value, 0.005, { least: -0.05 }));
			})
		);
	});
	it('only ever loses certainty when the instrument is coarser', () => {
		fc.assert(
			fc.property(fc.integer({ min: 0, max: 120 }), fc.integer({ min: 1, max: 20 }), (off, u) => {
				const fine = rule(off / 1000, u / 1000, { least: 0.02, most: 0.07 });
				const coarse = rule(off / 1000, (2 * u) / 1000, { least: 0.02, most: 0.07 });
				if (fine === 'too-close') expect(coarse).toBe('too-close');
				else expect([fine, 'too-close']).toContain(coarse);
			})
		);
	});
	it('says why and what to do next, for each question and ruling', () => {
		const said = (['build', 'run-again'] as const).flatMap((question) =>
			[0.05, 0.068, 0.09].map((value) => {
				const found = ruleReading({ question, value, expandedUncertainty: 0.005, most: 0.07 });
				if (!found.ok) throw new Error(found.because);
				return found.value;
			})
		);
		expect(said.map(({ ruling }) => ruling)).toEqual(
			[0, 1].flatMap(() => ['within', 'too-close', 'out'])
		);
		for (const { because, next, guardBand } of said) {
			expect(because).toMatch(/^[A-Z].+\.$/);
			expect(next).toMatch(/^[A-Z].+\.$/);
			expect(guardBand).toBe(0.005);
		}
		// What to do differs by the question, except that nobody decides on a reading too close to call.
		expect(new Set(said.map(({ next }) => next)).size).toBe(5);
	});
	it('calls nothing within where the limits are closer than twice the uncertainty', () => {
		fc.assert(
			fc.property(fc.integer({ min: 0, max: 100 }), (off) => {
				expect(rule(off / 1000, 0.006, { least: 0.04, most: 0.05 })).not.toBe('within');
			})
		);
	});
	it('gives a ruling or a reason for any figures', () => {
		const any = fc.option(fc.double(), { nil: undefined });
		fc.assert(
			fc.property(fc.double(), fc.double(), any, any, (value, u, least, most) => {
				const found = ruleReading({
					question: 'build',
					value,
					expandedUncertainty: u,
					least,
					most
				});
				const numbers = [value, u, least ?? 0, most ?? 0].every(Number.isFinite);
				if (!numbers) expect(found.ok).toBe(false);
				else if (found.ok) expect(found.value.because).not.toBe('');
			}),
			{ numRuns: 500 }
		);
	});
	it('refuses what cannot be ruled', () => {
		expect(ruleReading({ question: 'build', value: 1, expandedUncertainty: 0.1 }).ok).toBe(false);
		expect(
			ruleReading({ question: 'build', value: Number.NaN, expandedUncertainty: 0.1, most: 1 }).ok
		).toBe(false);
		expect(
			ruleReading({ question: 'build', value: 1, expandedUncertainty: 0.1, least: 2, most: 1 }).ok
		).toBe(false);
	});
});

describe('uncertainty', () => {
	it('of a least count is rectangular (JCGM 100:2008, F.2.2.1: u = δ/√12 = 0.29 δ)', () => {
		expect(standardUncertaintyMm(1, 0)).toBeCloseTo(0.29, 2);
	});
	it('of a difference carries both readings (JCGM 100:2008, 5.1.2)', () => {
		expect(ofDifferenceMm(0.003, 0.004)).toBeCloseTo(0.005, 12);
		expect(expandedMm(0.005)).toBe(0.01);
	});
	it('refuses what is no uncertainty', () => {
		for (const bad of [-0.001, Number.NaN, Infinity]) {
			expect(() => expandedMm(bad)).toThrow(RangeError);
			expect(() => ofDifferenceMm(0.001, bad)).toThrow(RangeError);
			expect(() => standardUncertaintyMm(0.01, bad)).toThrow(RangeError);
			expect(() => standardUncertaintyMm(bad, 0)).toThrow(RangeError);
		}
	});
	it('grows with least count and with calibration', () => {
		fc.assert(
			fc.property(
				fc.double({ min: 0.0001, max: 0.1, noNaN: true }),
				fc.double({ min: 0, max: 0.1, noNaN: true }),
				(count, calibration) => {
					expect(standardUncertaintyMm(count * 2, calibration)).toBeGreaterThan(
						standardUncertaintyMm(count, calibration)
					);
					expect(standardUncertaintyMm(count, calibration + 0.01)).toBeGreaterThan(
						standardUncertaintyMm(count, calibration)
					);
				}
			)
		);
	});
});
