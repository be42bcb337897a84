import { describe, expect, it } from 'vitest';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import { dimensionOf, keysOf, limitsFor } from '$lib/domain/data-sheets/value-of';

const bore = (key: string) => ({
	key: `cylinder.${key}`,
	words: key,
	build: { least: 0, most: 0.01 },
	source: 'invented'
});
const sheet = () => ({
	code: 'AV1',
	key: 'av1',
	title: 'an engine',
	revision: 'A',
	issuedOn: '2026-01-02',
	drawnBy: 'A. Person',
	partFamilies: [{ key: 'cylinder', words: 'Cylinder' }],
	dimensions: ['a', 'b', 'c', 'd', 'e', 'f'].map(bore),
	fasteners: [
		{
			key: 'cylinder.bolt',
			words: 'Bolt',
			thread: { diameterMm: 8, pitchMm: 1 },
			propertyClass: '8.8',
			lubrication: 'dry',
			stages: [{ torqueNm: 10 }, { angleDeg: 90 }],
			reuse: 'new each time',
			source: 'invented'
		}
	],
	patterns: [
		{
			key: 'cylinder.bolts',
			words: 'Bolts',
			fastener: 'cylinder.bolt',
			bolts: [
				{ id: '1', xMm: 0, yMm: 10 },
				{ id: '2', xMm: 0, yMm: -10 }
			],
			printedOrder: ['1', '2']
		}
	]
});
type Draft = ReturnType<typeof sheet>;
const faults = (change: (draft: Draft) => void) => {
	const draft = sheet();
	change(draft);
	const result = dataSheetSchema.safeParse(draft);
	return result.success ? [] : result.error.issues.map((one) => one.message);
};

describe('a data sheet', () => {
	it('is taken as it stands', () => {
		expect(faults(() => undefined)).toEqual([]);
		const parsed = dataSheetSchema.parse(sheet());
		expect([...keysOf(parsed)]).toHaveLength(8);
		expect(dimensionOf(parsed, 'cylinder.a')?.decimals).toBe(3);
		expect(figuresOf(parsed).tightening('cylinder.bolt')).toMatchObject({
			ok: true,
			value: { singleUse: true, threadPitchMm: 1 }
		});
		expect(figuresOf(parsed).figure('cylinder.none')).toEqual({
			ok: false,
			because: 'the data sheet AV1 has no cylinder.none'
		});
	});

	it.each<[string, (draft: Draft) => void, string | RegExp]>([
		[
			'limits upside down',
			(d) => (d.dimensions[0]!.build = { least: 2, most: 1 }),
			/above the most/
		],
		['a key twice', (d) => (d.dimensions[1]!.key = 'cylinder.a'), 'cylinder.a stands twice'],
		[
			'an unknown part',
			(d) => (d.dimensions[1]!.key = 'ring.gap'),
			'ring.gap: no such part family'
		],
		['a pattern of nothing', (d) => (d.patterns[0]!.fastener = 'cylinder.nut'), /no fastener/],
		[
			'an order with a bolt left out',
			(d) => (d.patterns[0]!.printedOrder = ['1']),
			/every bolt once/
		]
	])('is refused with %s', (_, change, because) => {
		expect(faults(change).join('; ')).toMatch(because);
	});

	it('holds what has no wear limit to its build limits', () => {
		const dimension = dataSheetSchema.parse(sheet()).dimensions[0]!;
		expect(limitsFor(dimension, 'run-again')).toEqual({ least: 0, most: 0.01 });
		expect(limitsFor({ ...dimension, runAgain: { most: 0.05 } }, 'run-again')).toEqual({
			most: 0.05
		});
	});
});
