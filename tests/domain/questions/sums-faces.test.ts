import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import { sums, type SumName } from '$lib/domain/questions/sums/registry';
import type { SheetFigures } from '$lib/domain/questions/sheet-figures';
import { seeded } from '$lib/kernel/random/random';
import { referenceOf } from '../../support/reference';

function sheetOf(key: string): SheetFigures {
	const sheet = catalogue().engines.find((one) => one.key === key);
	if (!sheet) throw new Error(`the data sheet ${key} is gone`);
	return figuresOf(sheet);
}
const petrol = sheetOf('av3-1150');
const diesel = sheetOf('av4-2200d');

function drawn(name: SumName, given: Record<string, unknown>, sheet: SheetFigures, seed: string) {
	const sum = sums[name];
	const inputs = sum.draw(sum.parameters.parse(given), seeded(seed), sheet);
	if (!inputs.ok) throw new Error(inputs.because);
	const expected = sum.expected(inputs.value);
	if (!expected.ok) throw new Error(expected.because);
	const givenFigures = sum.given(inputs.value).map((one) => one.value);
	return { inputs: inputs.value, expected: expected.value, given: givenFigures, sum };
}

type Asked = [SheetFigures, SumName, Record<string, unknown>, least: number, most: number];
const asked: Asked[] = [
	[petrol, 'corner-twist', { of: 'head.flatness' }, 0.015, 0.1],
	[diesel, 'corner-twist', { of: 'head.flatness' }, 0.018, 0.12],
	[petrol, 'runout', { of: 'crankshaft.runout', ask: 'runout' }, 0.015, 0.1],
	[petrol, 'runout', { of: 'crankshaft.runout', ask: 'half' }, 0.0075, 0.05],
	[petrol, 'runout', { of: 'crankshaft.runout', ask: 'eccentricity' }, 0.004, 0.06],
	[diesel, 'rod-line', { ask: 'bend', bigEnd: true }, 0.006, 0.14],
	[diesel, 'rod-line', { ask: 'twist' }, 0.0125, 0.15],
	[petrol, 'at-20', { of: 'crankpin.diameter', material: 'steel' }, 39.96, 40.02],
	[petrol, 'at-20', { of: 'piston.diameter', material: 'piston-alloy' }, 73.94, 73.995],
	[diesel, 'at-20', { of: 'crankpin.diameter', material: 'steel' }, 51.96, 52.015],
	[petrol, 'valve-shim', { lash: 'valve.exhaustLash' }, 2, 2.8],
	[petrol, 'shims-to-buy', { lash: 'valve.inletLash' }, 1, 3]
];

const cases = asked.map(([sheet, ...one]) => [sheet.title, ...one, sheet] as const);

describe.each(cases)('%s: %s %j', (_, name, given, least, most, sheet) => {
	it('lies within its bounds over 200 seeds, and its working ends in it', () => {
		for (let one = 0; one < 200; one++) {
			const { inputs, expected, sum } = drawn(name, given, sheet, `seed-${one}`);
			expect(expected.value).toBeGreaterThanOrEqual(least);
			expect(expected.value).toBeLessThanOrEqual(most);
			const last = sum.working(inputs).at(-1);
			expect(last?.unit).toBe(expected.unit);
			expect(last?.value).toBeCloseTo(expected.value, 6);
		}
	});
	it('gives what the instrument shows, and the same for the same seed', () => {
		fc.assert(
			fc.property(fc.uuid(), (seed) => {
				const { inputs, expected, sum } = drawn(name, given, sheet, seed);
				expect(drawn(name, given, sheet, seed).inputs).toEqual(inputs);
				for (const { value, decimals, unit } of sum.given(inputs)) {
					expect(value).toBe(Number(value.toFixed(decimals)));
					// Nobody may read the answer off what is given.
					if (unit === expected.unit) expect(value).not.toBeCloseTo(expected.value, 6);
				}
			})
		);
	});
});

describe('what a student can work by hand is what is expected', () => {
	const seeds = fc.uuid();
	it('four corners: half of what the two diagonals differ by', () => {
		fc.assert(
			fc.property(seeds, (seed) => {
				const { given, expected } = drawn('corner-twist', { of: 'head.flatness' }, petrol, seed);
				const [a = 0, b = 0, c = 0, d = 0] = given;
				expect(expected.value).toBeCloseTo(Math.abs(a + d - b - c) / 2, 6);
			})
		);
	});
	it('runout: largest less smallest; off its axis: from two halves of opposite readings', () => {
		fc.assert(
			fc.property(seeds, (seed) => {
				const all = { of: 'crankshaft.runout', ask: 'runout' };
				const eight = drawn('runout', all, petrol, seed);
				expect(eight.given).toHaveLength(8);
				expect(eight.expected.value).toBeCloseTo(
					Math.max(...eight.given) - Math.min(...eight.given),
					6
				);
				const four = drawn('runout', { ...all, ask: 'eccentricity' }, petrol, seed);
				const [r0 = 0, r90 = 0, r180 = 0, r270 = 0] = four.given;
				expect(four.expected.value).toBeCloseTo(Math.hypot((r0 - r180) / 2, (r90 - r270) / 2), 5);
			})
		);
	});
	it('rod: rise over length, less the big end’s, in 100 mm', () => {
		fc.assert(
			fc.property(seeds, fc.constantFrom('bend', 'twist'), (seed, ask) => {
				const { given, expected } = drawn('rod-line', { ask, bigEnd: true }, diesel, seed);
				const [near = 0, far = 0, bigNear = 0, bigFar = 0, apart = 0] = given;
				const rise = Math.abs(far - near - (bigFar - bigNear));
				expect(expected.value).toBeCloseTo((rise / apart) * 100, 5);
				expect(expected.value).toBeGreaterThan(0);
			})
		);
	});
	it('at 20 °C: the reading less the part’s growth, plus the instrument’s', () => {
		fc.assert(
			fc.property(seeds, (seed) => {
				const asks = { of: 'piston.diameter', material: 'piston-alloy' };
				const { given, expected } = drawn('at-20', asks, petrol, seed);
				const [read = 0, tp = 0, ts = 0, ap = 0, as = 0] = given;
				const byHand = read * (1 + (as * (ts - 20) - ap * (tp - 20)) * 1e-6);
				expect(expected.value).toBeCloseTo(byHand, 6);
				// Who leaves the correction out is wrong by more than the tolerance.
				expect(Math.abs(expected.value - read)).toBeGreaterThan(0.0025);
			})
		);
	});
	it('a shim: fitted, plus measured, less wanted, as the shop rule has it', () => {
		const rule = referenceOf<{ asks: string; fittedMm: number; lashMm: number; wantedMm: number }>(
			'valve-shims.json'
		).filter(([, one]) => one.asks === 'shim' && one.id !== 'S03');
		expect(rule.length).toBe(3);
		for (const [, { fittedMm: shim, lashMm: measured, wantedMm: wanted, expected }] of rule) {
			const found = sums['valve-shim'].expected({ shim, measured, wanted });
			expect(found.ok && found.value.value).toBeCloseTo(expected, 6);
		}
	});
	it('shims to buy: some must be, and some change places', () => {
		fc.assert(
			fc.property(seeds, (seed) => {
				const { expected, given, inputs, sum } = drawn(
					'shims-to-buy',
					{ lash: 'valve.inletLash' },
					petrol,
					seed
				);
				expect(Number.isInteger(expected.value)).toBe(true);
				expect(given).toHaveLength(8);
				expect(sum.working(inputs).some((step) => step.words.includes('from V'))).toBe(true);
			}),
			{ numRuns: 50 }
		);
	});
});

describe('a sheet that lacks what is asked', () => {
	it.each<[SumName, Record<string, unknown>]>([
		['corner-twist', { of: 'crankshaft.stroke' }],
		['corner-twist', { of: 'oil.reliefOpening' }],
		['runout', { of: 'crankshaft.stroke', ask: 'half' }],
		['at-20', { of: 'crankpin.oilClearance', material: 'steel' }],
		['at-20', { of: 'crankshaft.stroke', material: 'steel' }],
		['shims-to-buy', { lash: 'crankshaft.stroke' }],
		['shims-to-buy', { lash: 'valve.none' }]
	])('%s %j is refused in a sentence', (name, given) => {
		const sum = sums[name];
		const found = sum.draw(sum.parameters.parse(given), seeded('a'), petrol);
		expect(found.ok ? '' : found.because.length).toBeGreaterThan(10);
	});
	it('a part is of a material that the tables know', () => {
		const of = 'crankpin.diameter';
		expect(sums['at-20'].parameters.safeParse({ of, material: 'wood' }).success).toBe(false);
	});
});
