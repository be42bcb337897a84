import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cellsOf, filledCells, pastedCells, textOf } from '$lib/domain/crib/cells';
import { drawers } from '$lib/domain/crib/calculator';
import { fromLink, toLink } from '$lib/domain/crib/link';
import { exampleEntries, initialEntries, readEntries } from '$lib/domain/crib/read-entries';
import { calculators, cribIndex } from '$lib/domain/crib/registry';
import { isFigure } from '$lib/domain/crib/worked';
import { register } from '$lib/kernel/register';

describe.each(calculators.map((one) => [one.key, one] as const))('calculator %s', (_, one) => {
	it('works its example, with a working that a person could redo', () => {
		const read = readEntries(one, exampleEntries(one), 'metric');
		expect(read.faults).toEqual({});
		expect(read.wanted).toEqual([]);
		if (!read.worked?.ok) throw new Error(read.worked?.because ?? 'nothing was worked');
		const { lines, working, drawing } = read.worked.value;
		expect(lines.some((line) => line.main)).toBe(true);
		expect(new Set(lines.map((line) => line.key)).size).toBe(lines.length);
		expect(working.length).toBeGreaterThan(0);
		expect(working.some((step) => step.rule !== undefined && step.formula !== undefined)).toBe(
			true
		);
		expect(drawing).toBeDefined();
		for (const line of lines.filter(isFigure)) expect(line.value).not.toBeNaN();
	});
	it('says what is wanted while nothing is typed, and works nothing', () => {
		const read = readEntries(one, initialEntries(one), 'metric');
		expect(read.worked).toBeUndefined();
		expect(read.wanted.length).toBeGreaterThan(0);
	});
	it('comes back from its own link, in both systems', () => {
		for (const system of ['metric', 'inch'] as const) {
			const opened = { entries: exampleEntries(one), system };
			const again = fromLink(one, new URLSearchParams(toLink(one, opened)));
			expect(again.system).toBe(system);
			const texts = (entries: typeof opened.entries) =>
				Object.fromEntries(Object.entries(entries).map(([key, { text }]) => [key, text]));
			expect(texts(again.entries)).toEqual(texts(opened.entries));
		}
	});
	it('names rules that the register has, a drawer that exists, and what to mind', () => {
		const ids = register.map(({ id }) => id);
		expect(one.formulas.filter((id) => !ids.includes(id))).toEqual([]);
		expect(one.formulas.length + (one.sources?.length ?? 0)).toBeGreaterThan(0);
		expect(drawers.map(({ key }) => key)).toContain(one.drawer);
		expect(one.caution.length).toBeGreaterThan(20);
	});
	it('refuses nonsense in any field with a sentence, and never throws', () => {
		fc.assert(
			fc.property(
				fc.constantFrom(...Object.keys(one.fields)),
				fc.oneof(
					fc.string({ maxLength: 30 }),
					fc.constantFrom(
						'-1',
						'0',
						'1e400',
						'NaN',
						'1e9',
						'-1e9',
						'0_0*0_0',
						'_1',
						'1*1',
						'9'.repeat(60)
					)
				),
				(key, text) => {
					const entries = { ...exampleEntries(one), [key]: { text } };
					const read = readEntries(one, entries, 'metric');
					if (read.worked?.ok)
						for (const line of read.worked.value.lines)
							if (isFigure(line)) expect(Number.isFinite(line.value)).toBe(true);
					if (read.worked && !read.worked.ok) expect(read.worked.because.length).toBeGreaterThan(8);
				}
			),
			{ numRuns: 150 }
		);
	});
});

describe('the index', () => {
	it('lists each calculator once, with an address of its own', () => {
		const listed = cribIndex().flatMap((drawer) => drawer.calculators.map(({ key }) => key));
		expect(listed.toSorted()).toEqual(calculators.map(({ key }) => key).toSorted());
		expect(new Set(listed).size).toBe(listed.length);
	});
});

describe('a link', () => {
	const [one] = calculators;
	if (!one) throw new Error('the crib is empty');
	it('drops what is no field, and cuts what is too long', () => {
		const field = Object.keys(one.fields)[0] ?? '';
		const query = new URLSearchParams({
			elsewhere: '1',
			[field]: '7'.repeat(9000),
			units: 'furlong'
		});
		const opened = fromLink(one, query);
		expect(Object.keys(opened.entries).toSorted()).toEqual(Object.keys(one.fields).toSorted());
		expect(opened.entries[field]?.text.length).toBe(4000);
		expect(opened.system).toBe('metric');
	});
	it('takes cells by name, as a form without script sends them', () => {
		const grid = calculators.find((calculator) => calculator.key === 'oil-clearance');
		if (!grid) throw new Error('no oil clearance');
		const query = new URLSearchParams({
			'bore.0.0': '40.02',
			'bore.1.1': '40.03',
			'pin.0.0': '39.99'
		});
		expect(fromLink(grid, query).entries.bore?.text).toBe('40.02*_40.03');
		expect(fromLink(grid, new URLSearchParams({ 'bore.99.0': '1' })).entries.bore?.text).toBe('');
	});
});

describe('cells', () => {
	it('go into one text and come out again', () => {
		const cell = fc.stringMatching(/^[0-9.,a-zA-Z]{0,8}$/);
		fc.assert(
			fc.property(
				fc.array(fc.array(cell, { minLength: 1, maxLength: 5 }), { minLength: 1, maxLength: 5 }),
				(cells) => {
					fc.pre(textOf(cells) !== '');
					expect(cellsOf(textOf(cells))).toEqual(cells);
				}
			)
		);
	});
	it('are read without the spare rows and columns, and keep a gap between readings', () => {
		const cells = [
			['1', '', ''],
			['', '2', ''],
			['', ' ', '']
		];
		expect(filledCells(cells)).toEqual([
			['1', ''],
			['', '2']
		]);
		expect(filledCells([['', '']])).toEqual([]);
	});
	it.each([
		[
			'1.2\t1.3\n1.4\t1.5\n',
			[
				['1.2', '1.3'],
				['1.4', '1.5']
			]
		],
		[
			'1,2\t1,3\r\n1,4\t1,5',
			[
				['1,2', '1,3'],
				['1,4', '1,5']
			]
		],
		['1,2;1,3', [['1,2', '1,3']]],
		[
			'1.2,1.3\n1.4,1.5',
			[
				['1.2', '1.3'],
				['1.4', '1.5']
			]
		],
		['40,021\n40,018', [['40,021'], ['40,018']]],
		['a1 -129 45', [['a1', '-129', '45']]]
	])('are told apart in a pasted block %j', (text, wanted) => {
		expect(pastedCells(text)).toEqual(wanted);
	});
});
