import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { tighteningOrder } from '$lib/domain/crib/calculators/tightening-order';
import type { Worked } from '$lib/domain/crib/worked';
import { refusalOf, typed, workedOf } from './typed';

function textOf(worked: Worked, key: string): string {
	const line = worked.lines.find((one) => one.key === key);
	if (!line || !('text' in line)) throw new Error(`no words ${key}`);
	return line.text;
}
function drawnOf(worked: Worked) {
	if (worked.drawing?.kind !== 'pattern-order') throw new Error('no pattern is drawn');
	return worked.drawing;
}
const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
if (!sheet) throw new Error('the data sheet is gone');

describe('the order of a pattern', () => {
	it('goes from the middle outwards for rows, and each distance stands in the working', () => {
		const worked = workedOf(tighteningOrder, { own: '' });
		// A2 lies at √(43² + 45²) = 62.2 mm, A1 at √(129² + 45²) = 136.6 mm, by hand.
		const [step] = worked.working;
		expect(step?.formula).toMatch(/^A2 62\.2, B3 62\.2, .*A1 136\.6/);
		expect(drawnOf(worked).order).toHaveLength(8);
	});
	it('crosses a flange, told by number and circle alone', () => {
		// ASME PCC-1, cross pattern for eight (reference OR-F8).
		const worked = workedOf(tighteningOrder, { shape: 'ring', own: '' });
		expect(textOf(worked, 'order')).toBe('1 → 5 → 3 → 7 → 2 → 6 → 4 → 8');
		expect(worked.working[0]?.formula).toBe('1 and 5; 3 and 7; 2 and 6; 4 and 8');
		expect(drawnOf(worked).bolts[0]).toEqual({ id: '1', xMm: 0, yMm: 38 });
	});
	it('makes even rows of two counts and two distances', () => {
		const worked = workedOf(tighteningOrder, { shape: 'rows', own: '' });
		const { bolts, order } = drawnOf(worked);
		expect(bolts).toHaveLength(10);
		expect(bolts[0]).toEqual({ id: 'A1', xMm: -172, yMm: 45 });
		expect(bolts[9]).toEqual({ id: 'B5', xMm: 172, yMm: -45 });
		expect(order.slice(0, 2).toSorted()).toEqual(['A3', 'B3']);
	});
	it('needs no distance between rows where there is one row', () => {
		const row = { shape: 'rows', rows: '1', columns: '5', along: '50', across: '0', own: '' };
		expect(textOf(workedOf(tighteningOrder, row), 'order')).toBe('A3 → A2 → A4 → A1 → A5');
	});
	it('asks for no rows while the pattern is told by places, and for them when it is not', () => {
		const rows = { rows: '', columns: '', along: '', across: '', count: '', circle: '' };
		expect(typed(tighteningOrder, rows).wanted).toEqual([]);
		expect(typed(tighteningOrder, { ...rows, shape: 'rows' }).wanted).toEqual([
			'Rows',
			'Bolts in a row',
			'Along a row, bolt to bolt',
			'From row to row'
		]);
		expect(typed(tighteningOrder, { ...rows, shape: 'ring', bolts: '' }).wanted).toEqual([
			'Bolts around',
			'Bolt circle, diameter'
		]);
		expect(typed(tighteningOrder, { bolts: '' }).wanted).toEqual(['Bolts']);
	});
	it('is printed by the maker or reversed for loosening, and then nothing else is right', () => {
		const printed = 'A2 B3 B2 A3 A1 B4 B1 A4';
		const tighten = workedOf(tighteningOrder, { printed, own: printed });
		expect(textOf(tighten, 'order')).toBe(printed.split(' ').join(' → '));
		expect(textOf(tighten, 'own')).toContain('as it is printed');
		const mirrored = workedOf(tighteningOrder, { printed, own: 'B2 A3 A2 B3 B1 A4 A1 B4' });
		expect(textOf(mirrored, 'own')).toBe('wrong at step 1: B2, where A2 comes');
		expect(drawnOf(mirrored)).toMatchObject({ order: [], wrong: 'B2', wouldDo: ['A2'] });
		const loosen = workedOf(tighteningOrder, { printed, direction: 'loosen', own: '' });
		expect(textOf(loosen, 'order')).toBe('A4 → B1 → B4 → A1 → A3 → B2 → B3 → A2');
	});
});

describe('an order of one’s own', () => {
	it('is sound in any of the sound ways', () => {
		for (const own of ['A2 B3 B2 A3 A1 B4 B1 A4', 'B2, A3, A2, B3, B1, A4, A1, B4'])
			expect(textOf(workedOf(tighteningOrder, { own }), 'own')).toContain('sound, from the first');
	});
	it('is drawn as far as it holds, with what would do at the first wrong step', () => {
		const worked = workedOf(tighteningOrder, { own: 'A2 B3 A1 B2 A3 A4 B1 B4' });
		expect(textOf(worked, 'own')).toBe(
			'leaves every sound order at step 3: A1, where A3 or B2 would do'
		);
		expect(drawnOf(worked)).toMatchObject({
			order: ['A2', 'B3'],
			wrong: 'A1',
			wouldDo: ['A3', 'B2']
		});
	});
	it('may be unfinished: what stands is held to', () => {
		const own = (text: string) => textOf(workedOf(tighteningOrder, { own: text }), 'own');
		expect(own('A2 → B3')).toBe('sound as far as it goes, 2 steps; then 6 bolts are missing');
		expect(own('A2 A2')).toContain('1 step; then a bolt is named twice');
		expect(own('A2 B3 X9')).toContain('2 steps; then there is no bolt X9');
		expect(own('A1 B3')).toBe(
			'wrong at step 1: A1, where A2, A3, B2 or B3 would do; and 6 bolts are missing'
		);
	});
	it('of loosening goes from the outside inwards', () => {
		const own = (text: string) =>
			textOf(workedOf(tighteningOrder, { own: text, direction: 'loosen' }), 'own');
		expect(own('A4 B1 B4 A1 A3 B2 B3 A2')).toContain('sound, from the first');
		expect(own('A2 B3 B2 A3 A1 B4 B1 A4')).toContain('leaves every sound order at step 1');
	});
});

describe('a pattern', () => {
	it.each([
		['a_0_0*b_0.2_0', 'a and b stand in one place'],
		['a_0_0*a_50_0', 'a is named twice'],
		['a_0_0', 'a pattern has at least two bolts'],
		['a 1_0_0*b_50_0', 'one word, so that orders can be typed'],
		['a_0_0*b_50_', 'Bolt 2, y: nothing stands there']
	])('%s is refused: %s', (bolts, because) => {
		const found = typed(tighteningOrder, { bolts, own: '' });
		const said = found.worked?.ok === false ? found.worked.because : JSON.stringify(found.faults);
		expect(said).toContain(because);
	});
	it('with a printed order that does not fit it is refused', () => {
		expect(refusalOf(tighteningOrder, { printed: 'A2 B3' })).toContain('leaves out');
		expect(refusalOf(tighteningOrder, { printed: 'A2 B3 B2 A3 A1 B4 B1 Z9' })).toContain('A4');
	});
	it('too large is refused', () => {
		expect(refusalOf(tighteningOrder, { shape: 'rows', rows: '7', columns: '9' })).toContain(
			'two to 60 bolts'
		);
	});
	it('comes from a data sheet with its printed order, or without one', () => {
		const taken = tighteningOrder.presets?.(sheet) ?? [];
		expect(taken.map(({ key }) => key)).toEqual(sheet.patterns.map(({ key }) => key));
		for (const { key, values } of taken) {
			const pattern = sheet.patterns.find((one) => one.key === key);
			const worked = workedOf(tighteningOrder, values);
			expect(drawnOf(worked).bolts).toEqual(pattern?.bolts);
			if (pattern?.printedOrder) expect(drawnOf(worked).order).toEqual(pattern.printedOrder);
			else expect(worked.notes?.[0]).toContain('Several orders are sound');
		}
	});
});
