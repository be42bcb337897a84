import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import type { SheetFigures } from '$lib/domain/questions/sheet-figures';
import { sums, type SumName } from '$lib/domain/questions/sums/registry';
import { seeded } from '$lib/kernel/random/random';

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
	return {
		inputs: inputs.value,
		expected: expected.value,
		given: sum.given(inputs.value).map((one) => one.value),
		sum
	};
}

type Asked = [SheetFigures, SumName, Record<string, unknown>, least: number, most: number];
const asked: Asked[] = [
	[petrol, 'preload', { tightening: 'mainJournal.capBolt', ask: 'preload' }, 19, 41],
	[petrol, 'preload', { tightening: 'crankshaft.pulleyBolt', ask: 'share' }, 35, 82],
	[petrol, 'preload', { tightening: 'mainJournal.capBolt', ask: 'torque' }, 33, 77],
	[diesel, 'preload', { tightening: 'crankpin.rodBolt', ask: 'preload' }, 11, 23],
	[petrol, 'bolt-load', { ask: 'area' }, 20, 170],
	[petrol, 'bolt-load', { ask: 'proof' }, 7, 165],
	[petrol, 'bolt-load', { ask: 'yield' }, 8, 185],
	[petrol, 'bolt-load', { ask: 'tensile' }, 10, 205],
	[petrol, 'torque-share', { tightening: 'mainJournal.capBolt', ask: 'pitch' }, 9, 16],
	[petrol, 'torque-share', { tightening: 'mainJournal.capBolt', ask: 'preload' }, 20, 42],
	[diesel, 'torque-share', { tightening: 'head.bolt', ask: 'head' }, 33, 65],
	[diesel, 'torque-share', { tightening: 'head.bolt', ask: 'thread' }, 25, 55],
	[petrol, 'bolt-turn', { tightening: 'head.bolt', ask: 'yield-angle' }, 90, 150],
	[petrol, 'bolt-turn', { tightening: 'crankpin.rodBolt', ask: 'lasting' }, 0.027, 0.12],
	[diesel, 'bolt-turn', { tightening: 'crankpin.rodBolt', ask: 'yield-angle' }, 30, 75],
	[diesel, 'bolt-turn', { tightening: 'head.bolt', ask: 'preload' }, 30, 82],
	[diesel, 'stage-turn', { tightening: 'crankpin.rodBolt', ask: 'degrees' }, 5, 60]
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
	it('gives round figures, and the same for the same seed', () => {
		fc.assert(
			fc.property(fc.uuid(), (seed) => {
				const { inputs, sum } = drawn(name, given, sheet, seed);
				expect(drawn(name, given, sheet, seed).inputs).toEqual(inputs);
				for (const { value, decimals } of sum.given(inputs))
					expect(value).toBe(Number(value.toFixed(decimals)));
			})
		);
	});
});

/** Off by less than the tolerance that its question gives. */
function near(value: number, byHand: number, relative: number): void {
	expect(Math.abs(value / byHand - 1)).toBeLessThan(relative);
}

describe('what a student can work from the given figures is what is expected', () => {
	const seeds = fc.uuid();
	it('pull: torque over nut factor times diameter; share: of area times proof stress', () => {
		fc.assert(
			fc.property(seeds, (seed) => {
				const bolt = { tightening: 'crankshaft.pulleyBolt' };
				const pull = drawn('preload', { ...bolt, ask: 'preload' }, petrol, seed);
				const [d = 0, k = 0, torque = 0] = pull.given;
				near(pull.expected.value, torque / (k * d), 0.002);
				const share = drawn('preload', { ...bolt, ask: 'share' }, petrol, seed);
				const [, , , area = 0, proof = 0] = share.given;
				near(share.expected.value, (100 * torque) / (k * d) / ((area * proof) / 1000), 0.005);
				const back = drawn('preload', { ...bolt, ask: 'torque' }, petrol, seed);
				const [, factor = 0, wanted = 0] = back.given;
				near(back.expected.value, factor * d * wanted, 0.005);
			})
		);
	});
	it('a bolt’s loads: the stated area times the stress of its class', () => {
		fc.assert(
			fc.property(seeds, fc.constantFrom('proof', 'yield', 'tensile'), (seed, ask) => {
				const { given, expected } = drawn('bolt-load', { ask }, petrol, seed);
				const [d = 0, p = 0, stress = 0] = given;
				const area = (Math.PI / 4) * (d - 0.9382 * p) ** 2;
				near(expected.value, (area * stress) / 1000, 0.01);
			})
		);
	});
	it('shares of a torque: each part of the stated rule over the three', () => {
		fc.assert(
			fc.property(seeds, (seed) => {
				const bolt = { tightening: 'mainJournal.capBolt' };
				const of = (ask: string) => drawn('torque-share', { ...bolt, ask }, petrol, seed);
				const [p = 0, d2 = 0, mean = 0, thread = 0, head = 0] = of('pitch').given;
				const parts = [0.16 * p, 0.58 * d2 * thread, (mean / 2) * head];
				const all = parts.reduce((sum, one) => sum + one, 0);
				for (const [at, ask] of ['pitch', 'thread', 'head'].entries())
					near(of(ask).expected.value, (100 * (parts[at] ?? 0)) / all, 0.005);
				const [torque = 0] = of('preload').given;
				near(of('preload').expected.value, torque / all, 0.005);
			})
		);
	});
	it('turned bolts: the stated stiffness, straight to yield and level beyond', () => {
		const ask = (of: string, seed: string) => {
			const bolt = { tightening: 'head.bolt' };
			const { given, expected } = drawn('bolt-turn', { ...bolt, ask: of }, petrol, seed);
			const angles = given.slice(1, given.length - 7).reduce((sum, one) => sum + one, 0);
			const [k = 0, d = 0, p = 0, area = 0, length = 0, n = 0, stress = 0] = given.slice(-7);
			const both = ((205 * area) / length) * (n / (n + 1));
			const snug = (given[0] ?? 0) / (k * d);
			const yields = (360 * ((area * stress) / 1000 - snug)) / (both * p);
			return { value: expected.value, angles, both, snug, yields, p };
		};
		fc.assert(
			fc.property(seeds, (seed) => {
				const first = ask('yield-angle', seed);
				near(first.value, first.yields, 0.005);
				const pull = ask('preload', seed);
				expect(pull.angles).toBeLessThan(pull.yields);
				near(pull.value, pull.snug + (pull.both * pull.p * pull.angles) / 360, 0.005);
				const drawnOut = ask('lasting', seed);
				near(drawnOut.value, (drawnOut.p * (drawnOut.angles - drawnOut.yields)) / 360, 0.02);
			})
		);
	});
});

describe('a bolt that such a question cannot be asked of', () => {
	it.each([
		['bolt-turn', { tightening: 'mainJournal.capBolt', ask: 'lasting' }, 'has no angle'],
		['preload', { tightening: 'nothing.here', ask: 'preload' }, 'has no fastener'],
		['stage-turn', { tightening: 'mainJournal.capBolt', ask: 'degrees' }, 'no angle stage']
	] as const)('%s %j is refused with the reason', (name, given, because) => {
		const sum = sums[name];
		const found = sum.draw(sum.parameters.parse(given), seeded('a'), petrol);
		expect(found.ok ? '' : found.because).toContain(because);
	});
});
