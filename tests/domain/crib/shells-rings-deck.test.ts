import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { deckHeight } from '$lib/domain/crib/calculators/deck-height';
import { ringGap } from '$lib/domain/crib/calculators/ring-gap';
import { shellChoice } from '$lib/domain/crib/calculators/shell-choice';
import { shellCrush } from '$lib/domain/crib/calculators/shell-crush';
import type { DeckDrawing } from '$lib/domain/crib/drawings/deck';
import { figureOf, refusalOf, typed, workedOf } from './typed';

const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
if (!sheet) throw new Error('the data sheet is gone');
const textOf = (worked: ReturnType<typeof workedOf>, key: string) => {
	const line = worked.lines.find((one) => one.key === key);
	return line && 'text' in line ? line.text : undefined;
};
const rulingsOf = (worked: ReturnType<typeof workedOf>) =>
	worked.rulings?.map((one) => [one.of, one.question, one.ruling.ruling]);

describe('choosing shells', () => {
	it('works its example: 43.004 less two walls less 39.988', () => {
		const worked = workedOf(shellChoice);
		expect(textOf(worked, 'shell')).toBe('green');
		expect(figureOf(worked, 'clearance')).toBe(0.032);
		expect(figureOf(worked, 'shell-1')).toBe(0.044);
		expect(figureOf(worked, 'shell-2')).toBe(0.038);
		// 0.002 · √6: the wall counts twice
		expect(worked.rulings?.[0]?.expandedUncertainty).toBeCloseTo(0.004899, 6);
		expect(rulingsOf(worked)).toEqual([['Clearance with green', 'build', 'within']]);
	});
	it('shows every clearance where none serves', () => {
		const worked = workedOf(shellChoice, { pin: '39.800' });
		expect(textOf(worked, 'shell')).toContain('none');
		expect(figureOf(worked, 'shell-3')).toBe(0.22);
		expect(worked.rulings).toEqual([]);
	});
	it('refuses shells that fill their housing, and crossed limits', () => {
		expect(refusalOf(shellChoice, { shells: 'thick_22' })).toContain('thicker');
		expect(refusalOf(shellChoice, { least: '0.05' })).toContain('least to its most');
		expect(typed(shellChoice, { shells: 'red_' }).faults.shells).toContain('nothing stands');
	});
	it('takes the limits of a data sheet', () => {
		expect(shellChoice.presets?.(sheet)[0]?.values).toEqual({ least: '0.02', most: '0.048' });
	});
});

describe('crush and spread', () => {
	it('works its example: half the gap each, and the press of the circumference', () => {
		const worked = workedOf(shellCrush);
		expect(figureOf(worked, 'crush')).toBe(0.03);
		expect(figureOf(worked, 'press')).toBeCloseTo(0.06 / Math.PI, 6);
		expect(figureOf(worked, 'spread')).toBe(0.596);
		expect(rulingsOf(worked)).toEqual([['Crush of one half', 'build', 'within']]);
	});
	it('L38 a free width of 0.025 in over the bore (TM 5-3805-255-14, bearing fitting, step 6)', () => {
		const worked = workedOf(
			shellCrush,
			{ housing: '2.500', freeWidth: '2.525', gap: '0.002', least: '', most: '', uncertainty: '' },
			'inch'
		);
		expect(figureOf(worked, 'spread') / 25.4).toBeCloseTo(0.025, 6);
	});
	it('by length around the back says the same as by gap', () => {
		const around = ((Math.PI * 43.004) / 2 + 0.03).toFixed(4);
		const worked = workedOf(shellCrush, { how: 'length', around });
		expect(figureOf(worked, 'crush')).toBeCloseTo(0.03, 4);
	});
	it('warns of loose shells and of shells that fall out', () => {
		expect(workedOf(shellCrush, { gap: '0' }).notes?.[0]).toContain('they turn');
		expect(workedOf(shellCrush, { freeWidth: '43.0' }).notes?.[0]).toContain('falls out');
	});
	it('asks for what it was not given', () => {
		expect(refusalOf(shellCrush, { gap: '' })).toContain('gap at the split');
		expect(refusalOf(shellCrush, { how: 'length' })).toContain('around the back');
		expect(refusalOf(shellCrush, { how: 'length', around: '20' })).toContain('no half shell');
	});
});

describe('a ring’s end gap', () => {
	it('works its example', () => {
		const worked = workedOf(ringGap);
		// π · 0.050
		expect(figureOf(worked, 'growth')).toBeCloseTo(0.15708, 5);
		expect(figureOf(worked, 'there')).toBeCloseTo(0.47708, 5);
		expect(rulingsOf(worked)).toEqual([
			['Gap as measured', 'build', 'within'],
			['Gap at the widest', 'run-again', 'within']
		]);
	});
	it('G10 0.039 in and a bore 0.002 in larger make 0.045 in (trade magazine)', () => {
		const worked = workedOf(
			ringGap,
			{ gap: '0.039', bore: '5.400', widest: '5.402', buildLeast: '', buildMost: '', runMost: '' },
			'inch'
		);
		expect(Math.abs(figureOf(worked, 'there') / 25.4 - 0.045)).toBeLessThan(0.0005);
	});
	it('L20 a top ring of 0.017 to 0.027 in in a 5.500 in liner (TM 9-2815-213-34, para 3-178)', () => {
		const at = (gap: string) =>
			rulingsOf(
				workedOf(
					ringGap,
					{
						gap,
						bore: '',
						widest: '',
						buildLeast: '0.017',
						buildMost: '0.027',
						runMost: '',
						uncertainty: '0.0005'
					},
					'inch'
				)
			)?.map((one) => one.at(-1));
		expect(at('0.022')).toEqual(['within']);
		expect(at('0.015')).toEqual(['out']);
		expect(at('0.0268')).toEqual(['too-close']);
	});
	it('stands alone without a second bore, and refuses half of what it needs', () => {
		expect(figureOf(workedOf(ringGap, { bore: '', widest: '' }), 'gap')).toBe(0.32);
		expect(refusalOf(ringGap, { bore: '' })).toContain('where the gap was measured');
		expect(refusalOf(ringGap, { gap: '0.05', widest: '73.9' })).toContain('meet');
	});
	it('takes its limits from a data sheet', () => {
		const presets = ringGap.presets?.(sheet) ?? [];
		expect(presets.find((one) => one.key === 'ring.topGap')?.values).toEqual({
			buildLeast: '0.2',
			buildMost: '0.35',
			runMost: '0.8'
		});
		expect(presets.map((one) => one.key)).not.toContain('ring.topSideClearance');
	});
});

describe('pistons at the deck', () => {
	it('works its example: the highest decides', () => {
		const worked = workedOf(deckHeight);
		expect(figureOf(worked, 'highest')).toBe(0.57);
		expect(textOf(worked, 'gasket')).toBe('2 notches');
		expect(figureOf(worked, 'piston-2')).toBe(0.525);
		expect(figureOf(worked, 'rock')).toBeCloseTo(0.05, 6);
		expect(rulingsOf(worked)).toEqual([
			['Highest, piston 3', 'build', 'within'],
			['Lowest, piston 4', 'build', 'within']
		]);
		// 0.008 · √(0.5² + 0.5²)
		expect(worked.rulings?.[0]?.expandedUncertainty).toBeCloseTo(0.005657, 6);
		expect((worked.drawing as DeckDrawing).classes.map((one) => one.chosen)).toEqual([
			false,
			true,
			false
		]);
	});
	it('says when no class holds the highest, and goes without classes', () => {
		const none = workedOf(deckHeight, { pistons: '0.80_0.80' });
		expect(textOf(none, 'gasket')).toContain('none');
		expect(none.notes?.[0]).toContain('again');
		const free = workedOf(deckHeight, { classes: '', pistons: '-0.12_-0.10' });
		expect(figureOf(free, 'highest')).toBeCloseTo(-0.11, 9);
		expect(free.working[0]?.formula).toBe('(−0.120 + (−0.100)) / 2');
	});
	it('does not care about rock, nor about the order of the pistons', () => {
		const height = fc.integer({ min: 420, max: 660 });
		fc.assert(
			fc.property(fc.array(fc.tuple(height, height), { minLength: 1, maxLength: 6 }), (pistons) => {
				const typedAs = (these: [number, number][]) =>
					these.map((ends) => ends.map((one) => (one / 1000).toFixed(3)).join('_')).join('*');
				const swapped = pistons.map(([a, b]): [number, number] => [b, a]).toReversed();
				const [one, other] = [pistons, swapped].map((these) =>
					workedOf(deckHeight, { pistons: typedAs(these) })
				);
				if (!one || !other) throw new Error('nothing was worked');
				expect(figureOf(other, 'highest')).toBe(figureOf(one, 'highest'));
				expect(textOf(other, 'gasket')).toBe(textOf(one, 'gasket'));
			})
		);
	});
	it('takes the limits of a sheet that prints how high the crowns stand', () => {
		const diesel = catalogue().engines.find((one) => one.key === 'av4-2200d');
		if (!diesel) throw new Error('the data sheet is gone');
		expect(deckHeight.presets?.(diesel)).toEqual([
			expect.objectContaining({
				key: 'piston.protrusion',
				values: { least: '0.35', most: '0.55' }
			})
		]);
		expect(deckHeight.presets?.(sheet)).toEqual([]);
	});
	it('asks for both ends of each piston', () => {
		expect(typed(deckHeight, { pistons: '0.5_' }).faults.pistons).toContain('Other end');
	});
});
