import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import { sums, type SumName } from '$lib/domain/questions/sums/registry';
import { seeded } from '$lib/kernel/random/random';
import { ruleReading } from '$lib/kernel/measurement/ruling';

const sheets = catalogue().engines.map((one) => [one.code, figuresOf(one)] as const);
type Asked = [name: SumName, given: Record<string, unknown>, least: number, most: number];
const asked: Asked[] = [
	['reading-uncertainty', { of: 'crankpin.diameter', readings: 1, ask: 'expanded' }, 0.001, 0.009],
	[
		'reading-uncertainty',
		{ of: 'crankpin.diameter', readings: 4, ask: 'standard' },
		0.0005,
		0.0095
	],
	['reading-uncertainty', { of: 'crankpin.diameter', readings: 4, ask: 'scatter' }, 0.0004, 0.02],
	['called-within', { of: 'crankpin.diameter', purpose: 'build', edge: 'up-to' }, 39, 80],
	[
		'called-within',
		{ of: 'crankpin.oilClearance', purpose: 'run-again', edge: 'up-to' },
		0.02,
		0.2
	],
	['tool-for-limits', { of: 'crankpin.diameter', ask: 'needed' }, 0.0005, 0.01],
	['tool-for-limits', { of: 'crankpin.diameter', ask: 'expanded' }, 0.001, 0.04],
	['tool-for-limits', { of: 'crankpin.diameter', ask: 'ratio' }, 0.4, 20]
];
const cases = sheets.flatMap(([code, figures]) =>
	asked.map((one) => [code, ...one, figures] as const)
);

describe.each(cases)('%s: %s %j', (_, name, given, least, most, figures) => {
	const sum = sums[name];
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
				expect(expected.value).toBeGreaterThanOrEqual(least);
				expect(expected.value).toBeLessThanOrEqual(most);
				const last = sum.working(inputs).at(-1);
				expect([last?.value, last?.unit]).toEqual([expected.value, expected.unit]);
				expect(last?.rule).toBeDefined();
			}),
			{ numRuns: 200 }
		);
	});
	it('gives only what the instrument shows, and the same for the same seed', () => {
		fc.assert(
			fc.property(fc.uuid(), (seed) => {
				const { inputs } = drawn(seed);
				expect(drawn(seed).inputs).toEqual(inputs);
				for (const { value, decimals } of sum.given(inputs))
					expect(value).toBe(Number(value.toFixed(decimals)));
			})
		);
	});
});

describe('called within', () => {
	it('is the edge of the house’s ruling', () => {
		const [, figures] = sheets[0] ?? [];
		if (!figures) throw new Error('no data sheet');
		const sum = sums['called-within'];
		const asks = { of: 'crankpin.diameter', purpose: 'build', edge: 'up-to' };
		fc.assert(
			fc.property(fc.uuid(), (seed) => {
				const inputs = sum.draw(sum.parameters.parse(asks), seeded(seed), figures);
				if (!inputs.ok) throw new Error(inputs.because);
				const expected = sum.expected(inputs.value);
				const figure = figures.figure('crankpin.diameter');
				if (!expected.ok || !figure.ok) throw new Error('nothing is expected');
				const [given] = sum.given(inputs.value);
				const rule = (value: number) => {
					const { least, most } = figure.value;
					const found = ruleReading({
						question: 'build',
						value,
						expandedUncertainty: given?.value ?? NaN,
						...(least === undefined ? {} : { least }),
						...(most === undefined ? {} : { most })
					});
					return found.ok && found.value.ruling;
				};
				expect(rule(expected.value.value)).toBe('within');
				expect(rule(expected.value.value + 1e-6)).toBe('too-close');
			})
		);
	});
	it('asks nothing that the sheet or a pocket calculator cannot give', () => {
		const sum = sums['reading-uncertainty'];
		expect(
			sum.parameters.safeParse({ of: 'crankpin.diameter', readings: 3, ask: 'expanded' }).success
		).toBe(false);
		const [, figures] = sheets[0] ?? [];
		if (!figures) throw new Error('no data sheet');
		const none = { of: 'crankshaft.stroke', purpose: 'build', edge: 'up-to' };
		expect(sums['called-within'].draw(none, seeded('a'), figures).ok).toBe(false);
		expect(
			sums['tool-for-limits'].draw({ of: 'crankshaft.stroke', ask: 'ratio' }, seeded('a'), figures)
				.ok
		).toBe(false);
	});
});
