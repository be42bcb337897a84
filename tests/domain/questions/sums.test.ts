import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import { sumNames, sums, type SumName } from '$lib/domain/questions/sums/registry';
import { seeded } from '$lib/kernel/random/random';
import { expectWithin, referenceOf, type Worked } from '../../support/reference';

const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
if (!sheet) throw new Error('the data sheet is gone');
const figures = figuresOf(sheet);

/** Every sum, asked of the demo's data sheet, and the largest answer that a bench could give. */
const asked: [SumName, Record<string, unknown>, number][] = [
	['bore-grid', { of: 'cylinder.bore', ask: 'out-of-round' }, 0.03],
	['end-float', { of: 'crankshaft.endFloat' }, 0.34],
	['gauging-thread', { of: 'crankpin.oilClearance', ask: 'taper' }, 0.02],
	['journal-grid', { of: 'crankpin.diameter', ask: 'taper' }, 0.03],
	// This sheet prints no piston height: any two limits give crowns to read.
	['protrusion', { of: 'valve.inletLash' }, 1],
	[
		'shell-clearance',
		{
			housing: 'mainJournal.housingBore',
			wall: 'mainJournal.shellWall',
			pin: 'mainJournal.diameter',
			clearance: 'mainJournal.oilClearance'
		},
		0.052
	],
	['at-20', { of: 'crankpin.diameter', material: 'steel' }, 40.02],
	['corner-twist', { of: 'head.flatness' }, 0.1],
	['rod-line', { ask: 'bend' }, 0.2],
	['rod-line', { ask: 'twist', bigEnd: true }, 0.2],
	['runout', { of: 'crankshaft.runout', ask: 'half' }, 0.05],
	['runout', { of: 'crankshaft.runout', ask: 'eccentricity' }, 0.06],
	['shims-to-buy', { lash: 'valve.inletLash' }, 3],
	['bolt-load', { ask: 'tensile' }, 205],
	['bolt-turn', { tightening: 'head.bolt', ask: 'yield-angle' }, 150],
	['called-within', { of: 'crankpin.diameter', purpose: 'build', edge: 'up-to' }, 39.996],
	['called-within', { of: 'crankpin.diameter', purpose: 'run-again', edge: 'from' }, 39.98],
	['displacement', { bore: 'cylinder.bore', stroke: 'crankshaft.stroke', cylinders: 3 }, 1200],
	['fit-clearance', { outer: 'cylinder.bore', inner: 'piston.diameter' }, 0.2],
	[
		'oil-clearance',
		{ bore: 'crankpin.bearingBore', journal: 'crankpin.diameter', ask: 'least' },
		0.12
	],
	[
		'oil-clearance',
		{ bore: 'crankpin.bearingBore', journal: 'crankpin.diameter', ask: 'most' },
		0.15
	],
	['out-of-round', { of: 'crankpin.diameter' }, 0.02],
	['preload', { tightening: 'mainJournal.capBolt', ask: 'preload' }, 41],
	['reading-uncertainty', { of: 'crankpin.diameter', readings: 1, ask: 'expanded' }, 0.01],
	['reading-uncertainty', { of: 'crankpin.diameter', readings: 4, ask: 'standard' }, 0.01],
	['reading-uncertainty', { of: 'crankpin.diameter', readings: 5, ask: 'scatter' }, 0.02],
	['ring-gap', { bore: 'cylinder.bore', gap: 'ring.topGap' }, 1],
	['sheet-value', { of: 'crankpin.diameter', part: 'wearLimit' }, 40],
	['stage-turn', { tightening: 'head.bolt', ask: 'degrees' }, 180],
	['stage-turn', { tightening: 'head.bolt', ask: 'travel' }, 1.25],
	['taper', { of: 'crankpin.diameter' }, 0.02],
	['tool-for-limits', { of: 'crankpin.diameter', ask: 'needed' }, 0.002],
	['tool-for-limits', { of: 'crankpin.bearingBore', ask: 'expanded' }, 0.035],
	['tool-for-limits', { of: 'cylinder.bore', ask: 'ratio' }, 20],
	['torque-share', { tightening: 'mainJournal.capBolt', ask: 'pitch' }, 16],
	['torque-with-extension', { tightening: 'head.bolt', angle: 'straight', ask: 'wrench' }, 30],
	['torque-with-extension', { tightening: 'head.bolt', angle: 'any', ask: 'fastener' }, 60],
	['valve-shim', { lash: 'valve.inletLash' }, 3],
	['wear', { of: 'crankpin.diameter' }, 0.05],
	['wear', { of: 'cylinder.bore' }, 0.1]
];

it('every sum is asked here', () => {
	expect([...new Set(asked.map(([name]) => name))].sort()).toEqual([...sumNames].sort());
});

describe.each(asked)('%s %j', (name, given, most) => {
	const sum = sums[name];
	const parameters = sum.parameters.parse(given);

	it('draws what a bench could show, and its working ends in what it expects', () => {
		fc.assert(
			fc.property(fc.uuid(), (seed) => {
				const inputs = sum.draw(parameters, seeded(seed), figures);
				if (!inputs.ok) throw new Error(inputs.because);
				const expected = sum.expected(inputs.value);
				if (!expected.ok) throw new Error(expected.because);
				const { value, decimals, unit } = expected.value;
				expect(value).toBeGreaterThan(0);
				expect(value).toBeLessThanOrEqual(most + 1e-9);
				const last = sum.working(inputs.value).at(-1);
				expect(last?.unit).toBe(unit);
				expect(Math.abs((last?.value ?? NaN) - value)).toBeLessThanOrEqual(
					0.5 * 10 ** -decimals + 1e-9
				);
				for (const one of sum.given(inputs.value)) expect(one.value).toBeGreaterThanOrEqual(0);
			})
		);
	});

	it('names the data-sheet keys that it stands on', () => {
		for (const key of sum.sheetKeys(parameters))
			expect(
				figures.figure(key).ok || figures.tightening(key).ok || figures.steps(key).ok,
				key
			).toBe(true);
	});
});

/** What the sum expects of inputs that somebody has published the answer to. */
function expectedOf(name: SumName, inputs: unknown): number {
	const found = sums[name].expected(inputs);
	if (!found.ok) throw new Error(found.because);
	return found.value.value;
}

describe('published values', () => {
	const levers = referenceOf<Worked>('torque-wrench-levers.json');
	const leverOf = ({ inputs }: Worked) => ({
		torqueNm: inputs.Ta ?? inputs.Tw ?? NaN,
		lengthL: inputs.L ?? NaN,
		extensionE: inputs.E ?? NaN,
		angleDeg: inputs.a ?? 0
	});
	it.each(levers.filter(([, { inputs, id }]) => 'Ta' in inputs && id !== 'X04'))('%s', (_, one) => {
		expectWithin(
			expectedOf('torque-with-extension', { ask: 'wrench', words: '', ...leverOf(one) }),
			one
		);
	});
	it.each(levers.filter(([, { inputs }]) => 'Tw' in inputs))('%s', (_, one) => {
		expectWithin(
			expectedOf('torque-with-extension', { ask: 'fastener', words: '', ...leverOf(one) }),
			one
		);
	});

	it('displacement of a four, bore 100 mm, stroke 127 mm: 4.0 L (TM 5-3895-382-24)', () => {
		const four = expectedOf('displacement', { boreMm: 100, strokeMm: 127, cylinders: 4 });
		expect(four / 1000).toBeCloseTo(4.0, 1);
	});

	it('out-of-round and taper by definition (method as in TM 5-3805-262-34, p. 4-24)', () => {
		const read = (a: number, b: number) => ({ readings: [a, b], words: '', decimals: 4 });
		expect(expectedOf('out-of-round', read(3.5042, 3.5026))).toBeCloseTo(0.0016, 6);
		expect(expectedOf('taper', read(3.5042, 3.5011))).toBeCloseTo(0.0031, 6);
	});

	it('stem in guide, largest: 0.498 less 0.4945 in (TM 9-6115-604-34, table 1-4)', () => {
		const fit = { outer: 0.498, inner: 0.4945, outerWords: '', innerWords: '', decimals: 4 };
		expect(expectedOf('fit-clearance', fit)).toBeCloseTo(0.0035, 9);
	});

	it('a ring’s gap grows by about three times the bore (trade rule: 0.001 in adds 0.003 in)', () => {
		const grown = expectedOf('ring-gap', { boreGrowth: 0.001, gap: 0, decimals: 4 });
		expect(Math.abs(grown - 0.003)).toBeLessThanOrEqual(0.0002);
	});

	it('shim: new is old plus measured less wanted (shop rule, both ways)', () => {
		expect(expectedOf('valve-shim', { shim: 2.95, measured: 0.35, wanted: 0.2 })).toBeCloseTo(3.1);
		expect(expectedOf('valve-shim', { shim: 2.8, measured: 0.1, wanted: 0.2 })).toBeCloseTo(2.7);
	});
});
