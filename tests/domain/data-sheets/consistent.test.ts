import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { checkSheet } from '$lib/domain/data-sheets/consistency/check-sheet';
import type { DataSheet, Dimension, Fastener } from '$lib/domain/data-sheets/schema';
import { dataSheetSchema } from '$lib/domain/data-sheets/schema';
import { dimensionOf, fastenerOf } from '$lib/domain/data-sheets/value-of';
import { displacementCm3 } from '$lib/kernel/cylinder/displacement';

const { engines } = catalogue();

describe.each(engines.map((sheet) => [sheet.code, sheet] as const))('data sheet %s', (_, sheet) => {
	it('agrees with itself: nothing is refused and nothing is left to explain', () => {
		expect(checkSheet(sheet)).toEqual([]);
	});
	it('is complete: sizes, fasteners, patterns, the ways of oil and coolant, weak points', () => {
		expect(sheet.dimensions.length).toBeGreaterThanOrEqual(60);
		expect(sheet.fasteners.length).toBeGreaterThanOrEqual(15);
		expect(sheet.patterns.length).toBeGreaterThanOrEqual(4);
		for (const fluid of ['oil', 'coolant'])
			expect(sheet.ports.filter((one) => one.carries === fluid).length).toBeGreaterThanOrEqual(5);
		expect(sheet.weakPoints.length).toBeGreaterThanOrEqual(4);
		expect(sheet.fits.length).toBeGreaterThanOrEqual(8);
	});
	it('says of every value that it is invented', () => {
		for (const one of [...sheet.dimensions, ...sheet.fasteners])
			expect(one.source).toContain('invented for teaching');
	});
});

it('names the engines by what they sweep', () => {
	const swept = (key: string) => {
		const sheet = engines.find((one) => one.key === key);
		const nominal = (of: string) => (sheet && dimensionOf(sheet, of)?.nominal) ?? NaN;
		return displacementCm3(
			nominal('cylinder.bore'),
			nominal('crankshaft.stroke'),
			sheet?.layout?.cylinders ?? 1
		);
	};
	expect(Math.abs(swept('av3-1150') - 1150)).toBeLessThan(5);
	expect(Math.abs(swept('av4-2200d') - 2200)).toBeLessThan(5);
});

/** A copy of the petrol engine's sheet with one thing changed. */
function changed(change: (sheet: DataSheet) => void): DataSheet {
	const av3 = engines.find((one) => one.key === 'av3-1150');
	if (!av3) throw new Error('no AV3-1150');
	const copy = structuredClone(av3);
	change(copy);
	return copy;
}
const size = (sheet: DataSheet, key: string): Dimension => {
	const found = dimensionOf(sheet, key);
	if (!found) throw new Error(`no ${key}`);
	return found;
};
const bolt = (sheet: DataSheet, key: string): Fastener => {
	const found = fastenerOf(sheet, key);
	if (!found) throw new Error(`no ${key}`);
	return found;
};
const pattern = (sheet: DataSheet, at = 0) => {
	const found = sheet.patterns[at];
	if (!found) throw new Error('no pattern');
	return found;
};

describe('a faulty sheet', () => {
	it.each([
		[
			'refused',
			'crankpin.diameter',
			'lies above the most',
			(s: DataSheet) => (size(s, 'crankpin.diameter').build = { least: 40, most: 39.9 })
		],
		[
			'refused',
			'crankpin.diameter',
			'already be past its wear limit',
			(s: DataSheet) => (size(s, 'crankpin.diameter').runAgain = { least: 39.99 })
		],
		[
			'refused',
			'cylinder.bore',
			'already be past its wear limit',
			(s: DataSheet) => (size(s, 'cylinder.bore').runAgain = { most: 74.01 })
		],
		[
			'refused',
			'cylinder.bore',
			'to run again, the least',
			(s: DataSheet) => (size(s, 'cylinder.bore').runAgain = { least: 74.3, most: 74.2 })
		],
		[
			'warned',
			'cylinder.bore',
			'outside its build limits',
			(s: DataSheet) => (size(s, 'cylinder.bore').nominal = 75)
		],
		[
			'refused',
			'crankpin.oilClearance',
			'mark it as selectively fitted',
			(s: DataSheet) => (size(s, 'crankpin.oilClearance').build = { least: 0.025, most: 0.04 })
		],
		[
			'warned',
			'crankpin.oilClearance',
			'can never be met',
			(s: DataSheet) => (size(s, 'crankpin.oilClearance').build = { least: 0.01, most: 0.06 })
		],
		[
			'refused',
			'crankpin.oilClearance',
			'no pair of parts can have it',
			(s: DataSheet) => (size(s, 'crankpin.oilClearance').build = { least: 0.1, most: 0.12 })
		],
		[
			'refused',
			'mainJournal.bearingBore',
			'housing less two shells',
			(s: DataSheet) => (size(s, 'mainJournal.housingBore').build = { least: 52.1, most: 52.11 })
		],
		[
			'refused',
			'mainJournal.capBolt',
			'past its proof load',
			(s: DataSheet) => (bolt(s, 'mainJournal.capBolt').stages = [{ torqueNm: 90 }])
		],
		[
			'warned',
			'mainJournal.capBolt',
			'and used again',
			(s: DataSheet) => (bolt(s, 'mainJournal.capBolt').stages = [{ torqueNm: 70 }])
		],
		[
			'refused',
			'mainJournal.capBolt',
			'no more than the one before',
			(s: DataSheet) =>
				(bolt(s, 'mainJournal.capBolt').stages = [{ torqueNm: 50 }, { torqueNm: 25 }])
		],
		[
			'refused',
			'head.bolt',
			'is not yield-tightened',
			(s: DataSheet) => (bolt(s, 'head.bolt').stages = [{ torqueNm: 30 }, { angleDeg: 20 }])
		],
		[
			'refused',
			'head.bolt',
			'too far for one use',
			(s: DataSheet) =>
				(bolt(s, 'head.bolt').stages = [{ torqueNm: 30 }, { angleDeg: 360 }, { angleDeg: 180 }])
		],
		[
			'refused',
			'head.bolt',
			'yet “use again”',
			(s: DataSheet) => (bolt(s, 'head.bolt').reuse = 'use again')
		],
		[
			'warned',
			'head.bolt',
			'its stretched length is not given',
			(s: DataSheet) => delete bolt(s, 'head.bolt').gripMm
		],
		[
			'refused',
			'head.bolts',
			'stand in one place',
			(s: DataSheet) => Object.assign(pattern(s).bolts[1] ?? {}, { xMm: -129, yMm: 45.4 })
		],
		[
			'refused',
			'head.bolts',
			'leaves out',
			(s: DataSheet) => (pattern(s).printedOrder = ['A2', 'B3'])
		],
		[
			'refused',
			'layout',
			'stands twice',
			(s: DataSheet) => (s.layout = s.layout && { ...s.layout, firingOrder: [1, 3, 3] })
		],
		[
			'refused',
			'cylinder.compressionRatio',
			'is printed',
			(s: DataSheet) => (size(s, 'cylinder.clearanceVolume').nominal = 60)
		],
		[
			'refused',
			'piston.oversizes',
			'do not rise',
			(s: DataSheet) => Object.assign(s.oversizes[0] ?? {}, { stepsMm: [0.5, 0.25] })
		],
		[
			'warned',
			'piston.oversizes',
			'would not clean up',
			(s: DataSheet) => Object.assign(s.oversizes[0] ?? {}, { stepsMm: [0.05, 0.25] })
		],
		[
			'warned',
			'title',
			'the title says',
			(s: DataSheet) => (s.title = 'three-cylinder petrol engine, 1300 cm³')
		],
		[
			'warned',
			'oil.gallery',
			'where no way of the oil arrives',
			(s: DataSheet) =>
				Object.assign(s.ports.find((one) => one.key === 'oil.gallery') ?? {}, { from: 'Nowhere' })
		],
		[
			'warned',
			'valve.shims',
			'no whole number of steps',
			(s: DataSheet) => Object.assign(s.shims[0] ?? {}, { stepMm: 0.07 })
		],
		[
			'warned',
			'crankpin.oilClearance',
			'no fit says',
			(s: DataSheet) => (s.fits = s.fits.slice(1))
		],
		[
			'warned',
			'cylinder.bore',
			'no page in it',
			(s: DataSheet) => (size(s, 'cylinder.bore').source = 'shop manual')
		]
	])('%s at %s: %s', (severity, at, says, change) => {
		const found = checkSheet(changed(change)).filter((one) => one.at === at);
		expect(found.map((one) => one.severity)).toContain(severity);
		expect(found.map((one) => one.says).join('\n')).toContain(says);
	});
	it('whose parts are chosen for each other may print a closer clearance than their limits give', () => {
		const sheet = changed((s) => {
			size(s, 'crankpin.oilClearance').build = { least: 0.025, most: 0.04 };
			s.fits = s.fits.map((one) =>
				one.clearance === 'crankpin.oilClearance' ? { ...one, selective: true } : one
			);
		});
		expect(checkSheet(sheet)).toEqual([]);
	});
	it('puts what is refused before what is only warned of', () => {
		const found = checkSheet(
			changed((s) => {
				s.title = 'an engine of 1300 cm³';
				bolt(s, 'head.bolt').reuse = 'use again';
			})
		);
		expect(found.map((one) => one.severity)).toEqual(['refused', 'warned']);
	});
});

describe('the form of a sheet', () => {
	const plain = () =>
		JSON.parse(JSON.stringify(changed(() => undefined))) as Record<string, unknown>;
	it.each([
		[
			'a fit of a size that is not there',
			{
				fits: [
					{
						clearance: 'crankpin.oilClearance',
						outer: 'crankpin.nothing',
						inner: 'crankpin.diameter'
					}
				]
			},
			'crankpin.nothing'
		],
		[
			'an oversize of nothing',
			{
				oversizes: [
					{
						key: 'piston.oversizes',
						words: 'x',
						of: 'cylinder.nothing',
						kind: 'oversize',
						stepsMm: [0.5],
						source: 'x'
					}
				]
			},
			'cylinder.nothing'
		],
		[
			'a weak point of no family',
			{
				weakPoints: [
					{
						key: 'oil.x',
						words: 'x',
						family: 'gearbox',
						fails: 'x',
						shows: 'x',
						check: 'x',
						source: 'x'
					}
				]
			},
			'gearbox'
		],
		['five values', { dimensions: [] }, 'Six values']
	])('refuses %s', (_, change, says) => {
		const parsed = dataSheetSchema.safeParse({ ...plain(), ...change });
		expect(parsed.success ? '' : JSON.stringify(parsed.error.issues)).toContain(says);
	});
});
