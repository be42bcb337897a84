import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { endFloat } from '$lib/domain/crib/calculators/end-float';
import { gaugingThread } from '$lib/domain/crib/calculators/gauging-thread';
import { oilClearance } from '$lib/domain/crib/calculators/oil-clearance';
import { pistonToBore } from '$lib/domain/crib/calculators/piston-to-bore';
import { ringSideClearance } from '$lib/domain/crib/calculators/ring-side-clearance';
import { stemToGuide } from '$lib/domain/crib/calculators/stem-to-guide';
import { figureOf, refusalOf, typed, workedOf } from './typed';

const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
if (!sheet) throw new Error('the data sheet is gone');
const noLimits = { buildLeast: '', buildMost: '', runMost: '' };
const rulingsOf = (worked: ReturnType<typeof workedOf>) =>
	worked.rulings?.map((one) => [one.of, one.question, one.ruling.ruling]);

describe('oil clearance', () => {
	it('works its example and rules both ends', () => {
		const worked = workedOf(oilClearance);
		// 40.023 − 39.992, 40.026 − 39.986, 40.0245 − 39.989
		expect(figureOf(worked, 'least')).toBe(0.031);
		expect(figureOf(worked, 'most')).toBe(0.04);
		expect(figureOf(worked, 'mean')).toBeCloseTo(0.0355, 6);
		expect(figureOf(worked, 'usual')).toBeCloseTo(0.04, 4);
		expect(rulingsOf(worked)).toEqual([
			['Least clearance', 'build', 'within'],
			['Most clearance', 'build', 'within'],
			['Most clearance', 'run-again', 'within']
		]);
		// √(0.003² + 0.002²)
		expect(worked.rulings?.[0]?.expandedUncertainty).toBeCloseTo(0.003606, 6);
	});
	it('L01 a main bearing of 0.0016 to 0.0043 in is ruled in inches (TM 9-2815-260-24, p. 5-65)', () => {
		const at = (pin: string) =>
			rulingsOf(
				workedOf(
					oilClearance,
					{
						bore: '2.0030',
						pin,
						buildLeast: '0.0016',
						buildMost: '0.0043',
						runMost: '',
						boreU: '0.0001',
						pinU: '0.0001'
					},
					'inch'
				)
			)?.map((one) => one.at(-1));
		expect(at('2.0000')).toEqual(['within']);
		expect(at('2.0013')).toEqual(['too-close']);
		expect(at('1.9980')).toEqual(['out']);
	});
	it('rules nothing while an uncertainty is missing', () => {
		expect(workedOf(oilClearance, { pinU: '' }).rulings).toEqual([]);
	});
	it('refuses a pin as large as its bearing, and a reading not taken', () => {
		expect(refusalOf(oilClearance, { pin: '40.024' })).toContain('as large as');
		expect(refusalOf(oilClearance, { pin: '39.99_*39.99_39.98' })).toContain('pin');
	});
	it('takes the limits of every oil clearance in a data sheet', () => {
		const presets = oilClearance.presets?.(sheet) ?? [];
		const keys = presets.map((one) => one.key);
		expect(keys).toEqual(
			expect.arrayContaining(['crankpin.oilClearance', 'mainJournal.oilClearance'])
		);
		expect(keys.every((key) => key.endsWith('.oilClearance'))).toBe(true);
		expect(presets.find((one) => one.key === 'crankpin.oilClearance')?.values).toEqual({
			buildLeast: '0.02',
			buildMost: '0.048',
			runMost: '0.07'
		});
	});
});

describe('a gauging thread', () => {
	it('works its example', () => {
		const worked = workedOf(gaugingThread);
		expect(figureOf(worked, 'mean')).toBeCloseTo(0.133 / 3, 6);
		expect(figureOf(worked, 'taper')).toBe(0.013);
		// 0.051 lies above 0.048 by less than 0.006
		expect(rulingsOf(worked)?.at(1)).toEqual(['Most clearance', 'build', 'too-close']);
	});
	it('L04 0.0007 to 0.0025 in by thread, used up to 0.0047 in (TM 9-2815-254-24, p. 3-140)', () => {
		const worked = workedOf(
			gaugingThread,
			{
				reads: '0.0035; 0.0040',
				buildLeast: '0.0007',
				buildMost: '0.0025',
				runMost: '0.0047',
				uncertainty: '0.0003'
			},
			'inch'
		);
		expect(rulingsOf(worked)).toEqual([
			['Least clearance', 'build', 'out'],
			['Most clearance', 'build', 'out'],
			['Most clearance', 'run-again', 'within']
		]);
	});
	it('reads widths by the scale of the pack, and shows how', () => {
		const scale = '2_0.05*3_0.03*4_0.02';
		const worked = workedOf(gaugingThread, { how: 'widths', reads: '2.5; 3', scale });
		expect(figureOf(worked, 'most')).toBe(0.04);
		expect(figureOf(worked, 'least')).toBe(0.03);
		expect(worked.working[0]?.formula).toBe(
			'0.050 + (0.030 − 0.050) · (2.50 − 2.00) / (3.00 − 2.00)'
		);
		expect(worked.working[1]?.words).toContain('a mark of the scale');
	});
	it('refuses a width that no mark stands for, and widths without a scale', () => {
		expect(refusalOf(gaugingThread, { how: 'widths' })).toContain('marks');
		const scale = '2_0.05*3_0.03';
		expect(refusalOf(gaugingThread, { how: 'widths', reads: '2.5; 3.4', scale })).toContain(
			'place 2'
		);
		expect(
			refusalOf(gaugingThread, { how: 'widths', reads: '2.5', scale: '2_0.03*3_0.05' })
		).toContain('wider mark');
		expect(refusalOf(gaugingThread, { reads: '0.04; -0.01' })).toContain('above zero');
	});
	it('has no taper where it is even, and least ≤ mean ≤ most', () => {
		const read = fc.integer({ min: 10, max: 200 }).map((one) => (one / 1000).toFixed(3));
		fc.assert(
			fc.property(fc.array(read, { minLength: 1, maxLength: 6 }), (reads) => {
				const worked = workedOf(gaugingThread, { ...noLimits, reads: reads.join('; ') });
				const [least, mean, most] = ['least', 'mean', 'most'].map((key) => figureOf(worked, key));
				expect(least).toBeLessThanOrEqual((mean ?? NaN) + 1e-6);
				expect(mean).toBeLessThanOrEqual((most ?? NaN) + 1e-6);
				if (new Set(reads).size === 1) expect(figureOf(worked, 'taper')).toBe(0);
			})
		);
	});
});

describe('end float', () => {
	it('works its example', () => {
		const worked = workedOf(endFloat);
		expect(figureOf(worked, 'float')).toBe(0.15);
		expect(rulingsOf(worked)).toEqual([
			['End float', 'build', 'within'],
			['End float', 'run-again', 'within']
		]);
	});
	it('L10 0.005 to 0.015 in, worn out at 0.022 in (TM 9-2815-213-34, para 3-176 b)', () => {
		const at = (away: string) =>
			rulingsOf(
				workedOf(
					endFloat,
					{
						towards: '0',
						away,
						buildLeast: '0.005',
						buildMost: '0.015',
						runMost: '0.022',
						uncertainty: '0.0004'
					},
					'inch'
				)
			)?.map((one) => one.at(-1));
		expect(at('0.010')).toEqual(['within', 'within']);
		expect(at('0.018')).toEqual(['out', 'within']);
		expect(at('0.030')).toEqual(['out', 'out']);
		expect(at('-0.010')).toEqual(['within', 'within']);
	});
	it('takes float and side clearance from a data sheet, not a ring’s', () => {
		const keys = endFloat.presets?.(sheet).map((one) => one.key);
		expect(keys).toEqual(expect.arrayContaining(['crankshaft.endFloat', 'crankpin.sideClearance']));
		expect(keys).not.toContain('ring.topSideClearance');
	});
});

describe('one part in another', () => {
	it('a piston in its bore, worked', () => {
		const worked = workedOf(pistonToBore);
		// 74.022 − 73.966, 74.031 − 73.964
		expect(figureOf(worked, 'least')).toBe(0.056);
		expect(figureOf(worked, 'most')).toBe(0.067);
		expect(rulingsOf(worked)?.map((one) => one.at(-1))).toEqual(['too-close', 'out', 'within']);
		expect(pistonToBore.presets?.(sheet).map((one) => one.key)).toContain('piston.clearance');
	});
	it('L22 a ring’s side clearance of 0.040 to 0.073 mm, worn out at 0.10 (TM 10-3930-653-14&P)', () => {
		const limits = { buildLeast: '0.04', buildMost: '0.073', runMost: '0.1' };
		const at = (groove: string) =>
			rulingsOf(
				workedOf(ringSideClearance, {
					...limits,
					outer: groove,
					inner: '1.500',
					outerU: '0.003',
					innerU: '0.002'
				})
			)?.map((one) => one.at(-1));
		expect(at('1.555')).toEqual(['within', 'within']);
		expect(at('1.585')).toEqual(['out', 'within']);
		expect(at('1.620')).toEqual(['out', 'out']);
		const keys = ringSideClearance.presets?.(sheet).map((one) => one.key);
		expect(keys).toContain('ring.topSideClearance');
		expect(keys).not.toContain('crankpin.sideClearance');
	});
	it('G15 and G16 a stem in its guide by printed sizes (TM 9-6115-604-34, table 1-4)', () => {
		const worked = workedOf(
			stemToGuide,
			{ ...noLimits, outer: '0.4972; 0.4980', inner: '0.4945; 0.4955' },
			'inch'
		);
		expect(figureOf(worked, 'most') / 25.4).toBeCloseTo(0.0035, 6);
		expect(figureOf(worked, 'least') / 25.4).toBeCloseTo(0.0017, 6);
		expect(stemToGuide.presets?.(sheet).map((one) => one.key)).toContain(
			'valve.inletStemClearance'
		);
	});
	it('says so where it binds, and refuses what is no size', () => {
		expect(workedOf(pistonToBore, { inner: '74.03' }).notes?.[0]).toContain('it binds there');
		expect(refusalOf(pistonToBore, { inner: '0' })).toContain('above zero');
		expect(typed(pistonToBore, { outer: 'wide' }).faults.outer).toBeDefined();
	});
	it('takes printed sizes from a sheet that says which two make the clearance', () => {
		const said = {
			...sheet,
			fits: [
				{
					clearance: 'piston.clearance',
					outer: 'cylinder.bore',
					inner: 'piston.diameter',
					selective: false
				}
			]
		};
		const printed = pistonToBore.presets?.(said).find((one) => one.key.endsWith('/printed'));
		expect(printed?.values).toEqual({ outer: '74; 74.02', inner: '73.96; 73.975' });
		const worked = workedOf(pistonToBore, printed?.values);
		expect(figureOf(worked, 'least')).toBe(0.025);
		expect(figureOf(worked, 'most')).toBe(0.06);
	});
	it('opens by as much as the outer grows or the inner shrinks', () => {
		const wear = fc.integer({ min: 0, max: 200 });
		fc.assert(
			fc.property(wear, wear, (outer, inner) => {
				const worked = workedOf(pistonToBore, {
					...noLimits,
					outer: (74 + outer / 1000).toFixed(3),
					inner: (73.96 - inner / 1000).toFixed(3)
				});
				expect(figureOf(worked, 'least')).toBeCloseTo(0.04 + (outer + inner) / 1000, 6);
				expect(figureOf(worked, 'most')).toBe(figureOf(worked, 'least'));
			})
		);
	});
});
