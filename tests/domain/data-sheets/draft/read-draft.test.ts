import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { draftFrom, type SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import { readBolts } from '$lib/domain/data-sheets/draft/bolt-rows';
import { readDraft } from '$lib/domain/data-sheets/draft/read-draft';
import type { RowSection } from '$lib/domain/data-sheets/draft/sections';
import { typedChanges } from '$lib/domain/data-sheets/draft/typed-change';

const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
if (!sheet) throw new Error('there is no AV3-1150');
const stamp = { key: sheet.key, revision: sheet.revision, issuedOn: sheet.issuedOn };
const begun = () => structuredClone(draftFrom(sheet).draft);

/** The row of a section that has this key, to type in. */
function rowOf(draft: SheetDraft, section: RowSection, key: string) {
	const row = draft.rows[section].find((one) => one.values.key === key);
	if (!row) throw new Error(`no ${key}`);
	return row;
}

describe('a draft', () => {
	it.each(catalogue().engines.map((one) => [one.code, one] as const))(
		'of %s reads back as the sheet that it was begun from',
		(_, one) => {
			const { draft, leftOut } = draftFrom(one);
			const { key, revision, issuedOn } = one;
			expect(readDraft(draft, { key, revision, issuedOn })).toEqual({ faults: [], sheet: one });
			expect(leftOut).toEqual([]);
		}
	);

	it.each([
		['dimensions', 'crankpin.diameter', 'most', '40,0x', /cannot be read/],
		['dimensions', 'crankpin.diameter', 'least', '41', /least limit lies above the most/],
		['dimensions', 'crankpin.diameter', 'most', '', /Fill this in/],
		['dimensions', 'crankpin.diameter', 'source', ' ', /Fill this in/],
		['dimensions', 'crankpin.diameter', 'decimals', '9', /Not above 4/],
		['fasteners', 'head.bolt', 'stages', '30 Nm + soon', /stage 2/],
		['fasteners', 'head.bolt', 'thread', 'M11', /no usual pitch/],
		['fasteners', 'head.bolt', 'propertyClass', '', /Choose one/],
		['fasteners', 'head.bolt', 'count', '-3', /count/],
		['patterns', 'head.bolts', 'bolts', 'A1 -129', /line 1/],
		['patterns', 'head.bolts', 'printedOrder', 'A1 A2', /every bolt once/]
	] as const)(
		'says in %s, %s, at %s what is wrong with “%s”',
		(section, key, field, text, says) => {
			const draft = begun();
			const row = rowOf(draft, section, key);
			row.values[field] = text;
			const { faults, sheet: read } = readDraft(draft, stamp);
			expect(read).toBeUndefined();
			expect(faults).toEqual([
				{
					section,
					row: row.id,
					field: expect.any(String),
					words: expect.stringMatching(says)
				}
			]);
			if (!/lies above|every bolt/.test(String(says))) expect(faults[0]?.field).toBe(field);
		}
	);

	it('names a key that stands twice at the row that came last', () => {
		const draft = begun();
		const { values } = rowOf(draft, 'dimensions', 'crankpin.diameter');
		draft.rows.dimensions.push({ id: 'second', values: { ...values } });
		expect(readDraft(draft, stamp).faults).toEqual([
			{
				section: 'dimensions',
				row: 'second',
				field: 'key',
				words: 'crankpin.diameter stands twice.'
			}
		]);
	});

	it('with fewer than six values says so, and not in a field', () => {
		const draft = begun();
		draft.rows.dimensions.splice(5);
		const general = readDraft(draft, stamp).faults.filter((one) => one.section === 'sheet');
		expect(general.map((one) => one.words)).toContainEqual(expect.stringContaining('Six values'));
	});

	it('keeps what a file says wrongly, and says what has no field', () => {
		const { draft, leftOut } = draftFrom({
			code: 7,
			colour: 'grey',
			dimensions: [{ key: 'head.gap', words: 'Gap', nominal: 'about 2', hue: 'red' }, 'nonsense'],
			fasteners: 'none'
		});
		expect(draft.head.code).toBe('7');
		expect(draft.rows.dimensions.map((one) => one.values)).toEqual([
			{ words: 'Gap', nominal: 'about 2', key: 'head.gap' },
			{}
		]);
		expect(draft.rows.fasteners).toEqual([]);
		expect(leftOut).toEqual(['colour', 'dimensions 1, hue']);
	});
});

describe('bolts typed as rows', () => {
	it.each(['A1 -129 45\nA2 −43 45', 'A1\t-129\t45\r\nA2\t-43\t45\n', 'A1; -129; 45\nA2; -43; 45'])(
		'are read from %j',
		(text) => {
			expect(readBolts(text)).toEqual({
				bolts: [
					{ id: 'A1', xMm: -129, yMm: 45 },
					{ id: 'A2', xMm: -43, yMm: 45 }
				]
			});
		}
	);

	it('are drawn as far as they can be read', () => {
		const { bolts, fault } = readBolts('A1 0 0\nA2 12\nA3 1,5 2.5');
		expect(bolts.map((one) => one.id)).toEqual(['A1', 'A3']);
		expect(fault).toContain('line 2');
	});
});

describe('what was typed since', () => {
	it('is known field by field, by key and not by place', () => {
		const now = begun();
		rowOf(now, 'dimensions', 'crankpin.oilClearance').values.wearMost = '0,08';
		rowOf(now, 'dimensions', 'cylinder.bore').values.nominal = '74,00';
		now.rows.dimensions.reverse();
		now.rows.dimensions.push({ id: 'new', values: { key: 'oil.pressure', words: 'Oil pressure' } });
		const { was, isNew } = typedChanges(begun(), now);
		const id = (key: string) => rowOf(now, 'dimensions', key).id;
		expect(was('dimensions', id('crankpin.oilClearance'), 'wearMost')).toBe('0.07');
		expect(was('dimensions', id('crankpin.oilClearance'), 'words')).toBeUndefined();
		expect(was('dimensions', id('cylinder.bore'), 'nominal')).toBeUndefined();
		expect(isNew('dimensions', 'new')).toBe(true);
		expect(isNew('dimensions', id('cylinder.bore'))).toBe(false);
	});
});
