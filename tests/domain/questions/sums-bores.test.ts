import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import { sums, type SumName } from '$lib/domain/questions/sums/registry';
import { seeded } from '$lib/kernel/random/random';

const sheets = new Map(catalogue().engines.map((one) => [one.code, figuresOf(one)]));
type Asked = [
	code: string,
	name: SumName,
	given: Record<string, unknown>,
	least: number,
	most: number
];
const shells = (family: string) => ({
	housing: `${family}.housingBore`,
	wall: `${family}.shellWall`,
	pin: `${family}.diameter`,
	clearance: `${family}.oilClearance`
});
const undersize = { of: 'crankpin.diameter', ask: 'next-size', steps: 'crankpin.undersizes' };
const oversize = { of: 'cylinder.bore', ask: 'next-size', steps: 'piston.oversizes' };
const asked: Asked[] = [
	['AV3-1150', 'bore-grid', { of: 'cylinder.bore', ask: 'out-of-round' }, 0.004, 0.024],
	['AV3-1150', 'bore-grid', { of: 'cylinder.bore', ask: 'taper' }, 0.004, 0.024],
	['AV3-1150', 'bore-grid', oversize, 74.25, 75],
	['AV3-1150', 'journal-grid', { of: 'crankpin.diameter', ask: 'out-of-round' }, 0.004, 0.024],
	['AV3-1150', 'journal-grid', undersize, 39.5, 39.75],
	['AV4-2200D', 'journal-grid', { of: 'crankpin.diameter', ask: 'taper' }, 0.004, 0.024],
	['AV4-2200D', 'journal-grid', undersize, 51.25, 51.75],
	['AV3-1150', 'gauging-thread', { of: 'crankpin.oilClearance', ask: 'taper' }, 0.004, 0.018],
	['AV4-2200D', 'gauging-thread', { of: 'crankpin.oilClearance', ask: 'mean' }, 0.015, 0.09],
	['AV3-1150', 'shell-clearance', shells('mainJournal'), 0.022, 0.052],
	['AV4-2200D', 'shell-clearance', shells('crankpin'), 0.03, 0.06],
	['AV3-1150', 'end-float', { of: 'crankshaft.endFloat' }, 0.05, 0.33],
	['AV4-2200D', 'end-float', { of: 'crankshaft.endFloat' }, 0.05, 0.45],
	['AV4-2200D', 'protrusion', { of: 'piston.protrusion' }, 0.27, 0.63]
];

describe.each(asked)('%s: %s %j', (code, name, given, least, most) => {
	const sum = sums[name];
	const figures = sheets.get(code);
	if (!figures) throw new Error(`no ${code}`);
	const parameters = sum.parameters.parse(given);
	const drawn = (seed: string) => {
		const inputs = sum.draw(parameters, seeded(seed), figures);
		if (!inputs.ok) throw new Error(inputs.because);
		const expected = sum.expected(inputs.value);
		if (!expected.ok) throw new Error(expected.because);
		return { inputs: inputs.value, expected: expected.value };
	};
	it('lies within its bounds, and its working ends in it', () => {
		fc.assert(
			fc.property(fc.uuid(), (seed) => {
				const { inputs, expected } = drawn(seed);
				expect(expected.value).toBeGreaterThanOrEqual(least - 1e-9);
				expect(expected.value).toBeLessThanOrEqual(most + 1e-9);
				const last = sum.working(inputs).at(-1);
				expect([last?.value, last?.unit]).toEqual([expected.value, expected.unit]);
				expect(last?.rule).toBeDefined();
			}),
			{ numRuns: 200 }
		);
	});
	it('gives what the instrument shows and never the answer, the same for the same seed', () => {
		fc.assert(
			fc.property(fc.uuid(), (seed) => {
				const { inputs, expected } = drawn(seed);
				expect(drawn(seed).inputs).toEqual(inputs);
				for (const { value, decimals } of sum.given(inputs)) {
					expect(value).toBe(Number(value.toFixed(decimals)));
					expect(Math.abs(value - expected.value)).toBeGreaterThan(0.0003);
				}
				expect(sum.prompt(inputs)).toMatch(/\?$/);
			}),
			{ numRuns: 200 }
		);
	});
});

describe('sums that ask for less than a sheet has', () => {
	const figures = sheets.get('AV3-1150');
	if (!figures) throw new Error('no data sheet');
	it.each([
		['bore-grid', { of: 'crankpin.diameter', ask: 'taper' }, 'wear'],
		['journal-grid', { of: 'cylinder.bore', ask: 'taper' }, 'wear'],
		['bore-grid', { ...oversize, steps: 'crankshaft.stroke' }, 'oversizes'],
		['gauging-thread', { of: 'crankshaft.stroke', ask: 'mean' }, 'limits'],
		['end-float', { of: 'crankshaft.stroke' }, 'limit'],
		['protrusion', { of: 'crankshaft.stroke' }, 'limits'],
		['shell-clearance', { ...shells('mainJournal'), wall: 'crankshaft.stroke' }, 'limits'],
		['shell-clearance', { ...shells('mainJournal'), housing: 'cylinder.bore' }, 'within its limits']
	] as const)('%s %j says so', (name, given, because) => {
		const sum = sums[name];
		const found = sum.draw(sum.parameters.parse(given), seeded('a'), figures);
		expect(found.ok ? '' : found.because).toContain(because);
	});
	it('the next size wants its list of steps, and nothing else does', () => {
		const { parameters } = sums['bore-grid'];
		expect(parameters.safeParse({ of: 'cylinder.bore', ask: 'next-size' }).success).toBe(false);
		expect(parameters.safeParse({ ...oversize, ask: 'taper' }).success).toBe(false);
	});
});
