import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { flatness } from '$lib/domain/crib/calculators/flatness';
import type { FaceDrawing } from '$lib/domain/crib/drawings/face';
import { figureOf, refusalOf, typed, workedOf } from './typed';

describe('flatness of a face', () => {
	it('works its example: the high middle against the line between two far corners', () => {
		// 0.041 lies on the line between the places of 0.012 and 0.010, whose middle is 0.011.
		const worked = workedOf(flatness);
		expect(figureOf(worked, 'overall')).toBeCloseTo(0.03, 6);
		// Row 3, places 2 to 4: 0.048 less the middle of 0.031 and 0.043.
		expect(figureOf(worked, 'stretch')).toBeCloseTo(0.011, 6);
		// Row 3 end to end: 0.048 less the middle of 0.010 and 0.028.
		expect(figureOf(worked, 'line')).toBeCloseTo(0.029, 6);
		expect(worked.working[0]?.formula).toBe('−0.5000 · 0.012 + 1.0000 · 0.041 − 0.5000 · 0.010');
		expect(worked.rulings?.map((one) => [one.of, one.question, one.ruling.ruling])).toEqual([
			['Flatness overall', 'build', 'too-close'],
			['Flatness overall', 'run-again', 'within'],
			['Worst within 130 mm along a line', 'run-again', 'within']
		]);
		// √(0.5² + 1² + 0.5²) of 0.004
		expect(worked.rulings?.[0]?.expandedUncertainty).toBeCloseTo(0.0049, 5);
	});
	it('L41 0.005 in within 6 in and 0.010 in overall are two rulings (a maker’s service page)', () => {
		const worked = workedOf(
			flatness,
			{
				along: '0; 3; 6; 9; 12',
				across: '0; 6',
				readings: '0_0.004_0.001_0_0*0_0.001_0.001_0.001_0',
				buildMost: '',
				runMost: '0.010',
				stretch: '6',
				stretchMost: '0.005',
				uncertainty: '0.0005'
			},
			'inch'
		);
		expect(figureOf(worked, 'stretch')).toBeCloseTo(0.0035 * 25.4, 6);
		expect(worked.rulings?.map((one) => one.ruling.ruling)).toEqual(['within', 'within']);
		// Typed in inches, nothing of it is printed as binary leaves it.
		const printed = JSON.stringify([worked.working, worked.lines.map((one) => one.words)]);
		expect(printed).toContain('within 152.4 mm');
		expect(printed).not.toMatch(/\d\.\d{5,}[^\d.,}]*·/);
	});
	it('takes gaps under a straight edge, and says what it cannot see', () => {
		const worked = workedOf(flatness, {
			how: 'gaps',
			readings: '0_0.03_0.05_0.02_0*0_0.01_0.02_0.01_0*0_0_0.01_0_0',
			stretch: ''
		});
		expect(figureOf(worked, 'overall')).toBe(0.05);
		expect(figureOf(worked, 'line')).toBe(0.05);
		expect(worked.working[0]?.words).toContain('row 1 place 3');
		expect(worked.notes?.join(' ')).toContain('diagonals');
		expect((worked.drawing as FaceDrawing).rests).toBe('feeler');
	});
	it('cuts the empty cells that the grid opened with', () => {
		const small = { along: '0; 50; 100', across: '0; 40', stretch: '' };
		const worked = workedOf(flatness, { ...small, readings: '0_0.01_0__*0_0.02_0__*____' });
		expect(figureOf(worked, 'line')).toBe(0.02);
	});
	it('still judges the whole where a stretch holds too few readings', () => {
		const worked = workedOf(flatness, { stretch: '80' });
		expect(figureOf(worked, 'overall')).toBeCloseTo(0.03, 6);
		expect(worked.lines.some((one) => one.key === 'stretch')).toBe(false);
		expect(worked.notes?.[0]).toContain('no three readings lie within 80 mm');
	});
	it('refuses in a sentence what is no face', () => {
		expect(refusalOf(flatness, { along: '0; 65; 130' })).toContain('3 places along');
		expect(refusalOf(flatness, { across: '0; 90; 45' })).toContain('grow');
		expect(
			refusalOf(flatness, { how: 'gaps', readings: '0_-0.1_0_0_0*0_0_0_0_0*0_0_0_0_0' })
		).toContain('thickest feeler');
		const line = { along: '0; 65; 130; 195', across: '0', readings: '0_0.1_0_0' };
		expect(refusalOf(flatness, line)).toContain('one line');
		expect(typed(flatness, { buildMost: '-0.02' }).faults.buildMost).toContain('least');
	});
	it('takes the limits of every face in a data sheet', () => {
		const sheet = catalogue().engines.find((one) => one.key === 'av3-1150');
		if (!sheet) throw new Error('the data sheet is gone');
		const presets = flatness.presets?.(sheet) ?? [];
		expect(presets.find((one) => one.key === 'head.flatness')?.values).toEqual({
			buildMost: '0.03',
			runMost: '0.05'
		});
		expect(presets.map((one) => one.key)).toContain('cylinder.deckFlatness');
	});
});
