import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { bore } from '$lib/domain/crib/calculators/bore';
import { journal } from '$lib/domain/crib/calculators/journal';
import type { GridSectionDrawing } from '$lib/domain/crib/drawings/grid-section';
import { figureOf, refusalOf, typed, workedOf } from './typed';

const without = {
	nominal: '',
	printed: '',
	wearLimit: '',
	outOfRoundMost: '',
	taperMost: '',
	steps: '',
	stock: '',
	uncertainty: ''
};
const textOf = (worked: ReturnType<typeof workedOf>, key: string) => {
	const line = worked.lines.find((one) => one.key === key);
	return line && 'text' in line ? line.text : undefined;
};
const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
if (!sheet) throw new Error('the data sheet is gone');

describe('a cylinder bore', () => {
	it('works its example', () => {
		const worked = workedOf(bore);
		expect(figureOf(worked, 'worst')).toBe(74.052);
		// 74.052 − 74.028 at the top; 74.052 − 74.026 in plane 1
		expect(figureOf(worked, 'out-of-round')).toBe(0.024);
		expect(figureOf(worked, 'taper')).toBe(0.026);
		// means 74.0400, 74.0325, 74.0225
		expect(textOf(worked, 'shape')).toBe('tapered, widest at the first depth');
		expect(figureOf(worked, 'ends')).toBeCloseTo(-0.00125, 6);
		expect(figureOf(worked, 'wear')).toBe(0.032);
		// 74.25 − 74.052 is more than 0.05
		expect(figureOf(worked, 'next')).toBe(0.25);
		expect(figureOf(worked, 'left')).toBe(0.198);
		expect(worked.rulings?.map((one) => [one.of, one.ruling.ruling])).toEqual([
			['Largest reading', 'within'],
			['Out-of-round', 'within'],
			['Taper', 'within']
		]);
		// 0.004 · √2
		expect(worked.rulings?.[1]?.expandedUncertainty).toBeCloseTo(0.005657, 6);
		// Two readings of one size differ by 2/√π · u on average: 1.128 · 0.002
		expect(worked.notes?.[0]).toContain('about 0.002 mm');
		expect((worked.drawing as GridSectionDrawing).worst).toEqual({ depth: 0, plane: 0 });
	});
	it('G01, G02 and G03 in inches (method as in TM 5-3805-262-34, p. 4-24)', () => {
		const readings = '3.5042_3.5026*3.5011_3.5011';
		const worked = workedOf(bore, { ...without, readings, printed: '3.5000' }, 'inch');
		expect(figureOf(worked, 'out-of-round') / 25.4).toBeCloseTo(0.0016, 6);
		expect(figureOf(worked, 'taper') / 25.4).toBeCloseTo(0.0031, 6);
		expect(figureOf(worked, 'wear') / 25.4).toBeCloseTo(0.0042, 6);
		expect(worked.rulings).toEqual([]);
	});
	it.each([
		['74.00_74.00*74.03_74.03*74.00_74.00', 'barrel, widest in the middle'],
		['74.03_74.03*74.00_74.00*74.03_74.03', 'bell-mouthed, widest at its ends'],
		['74.00_74.00*74.01_74.01*74.03_74.03', 'tapered, widest at the last depth'],
		['74.00_74.00*74.002_74.00*74.00_74.00', 'straight, as far as these readings tell']
	])('%s is %s', (readings, shape) => {
		expect(textOf(workedOf(bore, { readings }), 'shape')).toBe(shape);
	});
	it('takes the next larger oversize where the stock asks for it, and says when none serves', () => {
		const readings = '74.22_74.21*74.15_74.15*74.10_74.10';
		expect(figureOf(workedOf(bore, { readings }), 'next')).toBe(0.5);
		expect(figureOf(workedOf(bore, { readings, stock: '0.02' }), 'next')).toBe(0.25);
		const gone = workedOf(bore, { readings: '74.90_74.90*74.1_74.1*74.1_74.1' });
		expect(textOf(gone, 'next')).toContain('no listed size cleans it up');
		expect(gone.rulings?.[0]?.ruling.ruling).toBe('out');
	});
	it('judges what one plane or one depth can tell, and says what it cannot', () => {
		const onePlane = workedOf(bore, { readings: '74.05*74.04*74.02' });
		expect(onePlane.lines.some((one) => one.key === 'out-of-round')).toBe(false);
		expect(figureOf(onePlane, 'taper')).toBe(0.03);
		expect(onePlane.notes?.[0]).toContain('second plane');
		const oneDepth = workedOf(bore, { readings: '74.05_74.02' });
		expect(oneDepth.lines.some((one) => one.key === 'taper')).toBe(false);
		expect(oneDepth.notes?.join(' ')).toContain('second depth');
	});
	it('refuses in a sentence what is no bore', () => {
		expect(refusalOf(bore, { readings: '74.05_74.02*74.04_' })).toContain('missing');
		expect(refusalOf(bore, { readings: '74.05_0*74.04_74.02' })).toContain('above zero');
		expect(refusalOf(bore, { readings: '74.05_-74*74.04_74.02' })).toContain('above zero');
		expect(typed(bore, { nominal: '-74' }).faults.nominal).toContain('least');
		expect(typed(bore, { stock: '-1' }).faults.stock).toContain('least');
		expect(textOf(workedOf(bore, { steps: '0.25; -1' }), 'next')).toContain('above zero');
	});
	it('takes its limits from a data sheet; a bearing’s bore is none that is machined', () => {
		const presets = bore.presets?.(sheet) ?? [];
		expect(presets.map((one) => one.key)).toEqual(['cylinder.bore']);
		expect(presets[0]?.values).toMatchObject({
			nominal: '74',
			printed: '74.02',
			wearLimit: '74.1',
			outOfRoundMost: '0.04',
			taperMost: '0.05'
		});
	});
	it('is offered the oversizes of a sheet that lists them', () => {
		const listed = {
			...sheet,
			oversizes: [
				{
					key: 'cylinder.boreOversizes',
					words: 'Oversizes',
					of: 'cylinder.bore',
					kind: 'oversize' as const,
					stepsMm: [0.25, 0.5],
					source: 'a test'
				}
			]
		};
		expect(bore.presets?.(listed)[0]?.values.steps).toBe('0.25; 0.5');
	});
});

describe('a crankpin or journal', () => {
	it('works its example', () => {
		const worked = workedOf(journal);
		expect(figureOf(worked, 'worst')).toBe(39.968);
		// 39.978 − 39.968 in the middle; 39.972 − 39.968 in plane 2
		expect(figureOf(worked, 'out-of-round')).toBe(0.01);
		expect(figureOf(worked, 'taper')).toBe(0.004);
		expect(figureOf(worked, 'wear')).toBe(0.012);
		expect(figureOf(worked, 'next-size')).toBe(39.75);
		expect(figureOf(worked, 'left')).toBe(0.218);
		// 0.010 against 0.008 with 0.002 · √2: nobody can tell
		expect(worked.rulings?.map((one) => [one.of, one.ruling.ruling])).toEqual([
			['Smallest reading', 'within'],
			['Out-of-round', 'too-close'],
			['Taper', 'within']
		]);
	});
	it('L09 out-of-round of 0.0008 in is over 0.0005 in (G04, TM 5-3805-262-34, p. 4-24)', () => {
		const worked = workedOf(
			journal,
			{
				...without,
				readings: '2.7482_2.7474',
				outOfRoundMost: '0.0005',
				uncertainty: '0.0001'
			},
			'inch'
		);
		expect(figureOf(worked, 'out-of-round') / 25.4).toBeCloseTo(0.0008, 6);
		expect(worked.rulings?.[0]?.ruling.ruling).toBe('out');
	});
	it('G17 the undersizes of that page clean up one after the other', () => {
		const size = (worn: string) =>
			figureOf(
				workedOf(
					journal,
					{
						...without,
						readings: `${worn}_${worn}`,
						nominal: '2.748',
						steps: '0.010; 0.020; 0.030'
					},
					'inch'
				),
				'next-size'
			) / 25.4;
		expect(['2.745', '2.735', '2.725'].map((worn) => size(worn).toFixed(3))).toEqual([
			'2.738',
			'2.728',
			'2.718'
		]);
	});
	it('an hourglass is thinnest in the middle', () => {
		const readings = '39.99_39.99*39.97_39.97*39.99_39.99';
		expect(textOf(workedOf(journal, { readings }), 'shape')).toBe(
			'hourglass, thinnest in the middle'
		);
	});
	it('turns round with its readings: the same form from the other end', () => {
		const reading = fc.integer({ min: 39_900, max: 40_000 }).map((one) => (one / 1000).toFixed(3));
		const rows = fc.array(fc.tuple(reading, reading), { minLength: 3, maxLength: 5 });
		fc.assert(
			fc.property(rows, (these) => {
				const asText = (one: readonly (readonly string[])[]) =>
					one.map((row) => row.join('_')).join('*');
				const [there, back] = [these, these.toReversed()].map((one) =>
					workedOf(journal, { ...without, readings: asText(one) })
				);
				if (!there || !back) throw new Error('nothing was worked');
				for (const key of ['worst', 'out-of-round', 'taper', 'ends'])
					expect(figureOf(back, key)).toBeCloseTo(figureOf(there, key), 5);
			})
		);
	});
	it('takes its limits from a data sheet, pins and main journals alike', () => {
		const presets = journal.presets?.(sheet) ?? [];
		expect(presets.map((one) => one.key)).toEqual(
			expect.arrayContaining(['crankpin.diameter', 'mainJournal.diameter', 'camshaft.journal'])
		);
		expect(presets[0]?.values).toMatchObject({
			nominal: '40',
			printed: '39.98',
			wearLimit: '39.95',
			outOfRoundMost: '0.008'
		});
	});
});
