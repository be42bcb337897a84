import { parse } from 'csv-parse/sync';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { changesBetween, touchedKeys } from '$lib/domain/data-sheets/changes';
import { lacksFor } from '$lib/domain/data-sheets/lacks';
import { sheetAsCsv } from '$lib/domain/data-sheets/sheet-as-csv';

const found = catalogue().engines.find((one) => one.key === 'av3-1150');
if (!found) throw new Error('no AV3-1150');
const av3 = found;

describe('what changes between two revisions', () => {
	it('is nothing where nothing does, and everything where there was no sheet', () => {
		expect(changesBetween(av3, structuredClone(av3))).toEqual([]);
		expect(changesBetween(undefined, av3).every((one) => one.what === 'added')).toBe(true);
	});
	it('is said in words, was and now, for sizes, bolts and orders', () => {
		const after = structuredClone(av3);
		const pin = after.dimensions.find((one) => one.key === 'crankpin.diameter');
		if (pin) pin.runAgain = { least: 39.96 };
		after.fasteners = after.fasteners.filter((one) => one.key !== 'oil.drainPlug');
		const [first] = after.patterns;
		if (first) first.printedOrder = first.printedOrder?.toReversed();
		const changes = changesBetween(av3, after);
		expect(changes.map(({ key, what }) => `${key} ${what}`).toSorted()).toEqual([
			'crankpin.diameter changed',
			'head.bolts changed',
			'oil.drainPlug removed'
		]);
		expect(changes.find((one) => one.key === 'crankpin.diameter')?.was).toContain('39.950 mm');
		expect(changes.find((one) => one.key === 'crankpin.diameter')?.now).toContain('39.960 mm');
		expect([...touchedKeys(changes)].toSorted()).toEqual([
			'crankpin.diameter',
			'head.bolts',
			'oil.drainPlug'
		]);
	});
});

describe('what a sheet lacks', () => {
	const jobSheet = catalogue()
		.courses.flatMap((one) => one.jobSheets)
		.find((one) => one.grids.length > 0);
	if (!jobSheet) throw new Error('no job sheet measures anything');
	it('is nothing for the job sheets that were made with it', () => {
		for (const course of catalogue().courses)
			for (const one of course.jobSheets) expect(lacksFor(course.sheet, one)).toEqual([]);
	});
	it('is each size that is measured and each limit that rules', () => {
		const bare = {
			...av3,
			dimensions: av3.dimensions.filter((one) => one.key.startsWith('valve.'))
		};
		const lacks = lacksFor(bare, jobSheet);
		expect(lacks.length).toBeGreaterThan(2);
		for (const one of lacks)
			expect(one.says).toMatch(/which the sheet does not have|which has no limits/);
	});
});

describe('a sheet as a table', () => {
	it('is read back by a reader of its own, every size with its limits', () => {
		const rows = parse(sheetAsCsv(av3), { columns: true }) as Record<string, string>[];
		expect(rows.filter((one) => one.kind === 'dimension')).toHaveLength(av3.dimensions.length);
		const pin = rows.find((one) => one.key === 'crankpin.diameter');
		expect(pin).toMatchObject({
			unit: 'mm',
			nominal: '40.000',
			'build least': '39.980',
			'build most': '39.996',
			'run again least': '39.950'
		});
		expect(rows.filter((one) => one.key === 'head.bolts')).toHaveLength(8);
	});
	it('is no trap for a spreadsheet: what looks like a formula stays words', () => {
		const odd = { ...av3, fluids: [{ words: '=1+1', amount: '@x', kind: 'a "b", c' }] };
		const csv = sheetAsCsv(odd);
		expect(csv).toContain(`fluid,,'=1+1`);
		expect(csv).toContain(`"'@x; a ""b"", c"`);
	});
});
