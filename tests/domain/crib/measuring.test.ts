import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import type { AnyCalculator } from '$lib/domain/crib/calculator';
import { groupStudy } from '$lib/domain/crib/calculators/group-study';
import { reading } from '$lib/domain/crib/calculators/reading';
import { ruling } from '$lib/domain/crib/calculators/ruling';
import { whichTool } from '$lib/domain/crib/calculators/which-tool';
import { exampleEntries, readEntries, type Entries } from '$lib/domain/crib/read-entries';
import { isFigure, type Worked } from '$lib/domain/crib/worked';
import { publishedIn } from '../../kernel/statistics/published';

type Typed = Record<string, string>;

function entriesOf(of: AnyCalculator, typed: Typed): Entries {
	const changed = Object.entries(typed).map(([key, text]) => [key, { text }] as const);
	return { ...exampleEntries(of), ...Object.fromEntries(changed) };
}

function worked(of: AnyCalculator, typed: Typed = {}): Worked {
	const read = readEntries(of, entriesOf(of, typed), 'metric');
	if (!read.worked?.ok)
		throw new Error(
			read.worked?.because ?? JSON.stringify({ ...read.faults, wanted: read.wanted })
		);
	return read.worked.value;
}

function refused(of: AnyCalculator, typed: Typed): string {
	const read = readEntries(of, entriesOf(of, typed), 'metric');
	const faults = Object.values(read.faults);
	if (faults[0] !== undefined) return faults[0];
	if (!read.worked || read.worked.ok) throw new Error('it was worked');
	return read.worked.because;
}

function figure({ lines }: Worked, key: string): number {
	const line = lines.find((one) => one.key === key);
	if (!line || !isFigure(line)) throw new Error(`no figure ${key}`);
	return line.value;
}

function text({ lines }: Worked, key: string): string {
	const line = lines.find((one) => one.key === key);
	if (!line || isFigure(line)) throw new Error(`no words ${key}`);
	return line.text;
}

const av3 = catalogue().engines.find((one) => one.key === 'av3-1150');
if (!av3) throw new Error('the data sheet is gone');

describe('uncertainty of a reading', () => {
	it('works its example as by hand', () => {
		const found = worked(reading);
		// 39.991 · (1 + 11.5e-6 · 1 − 12e-6 · 4): 0.00146 mm come off.
		expect(figure(found, 'mean')).toBeCloseTo(39.991, 9);
		expect(figure(found, 'value')).toBeCloseTo(39.991 - 0.00146, 5);
		// s 0.001 over √3; δ 0.001 over √12; 0.002 over 2; 39.991 · 12e-6 · 2 / √3 and · 11.5e-6;
		// 39.991 · 4 · 1.2e-6 / √3 and · 1 · 1.15e-6.
		const parts = [0.000577, 0.000289, 0.001, 0.000554, 0.000531, 0.000111, 0.0000266];
		expect(figure(found, 'standard')).toBeCloseTo(Math.hypot(...parts), 6);
		expect(figure(found, 'factor')).toBe(2);
		expect(text(found, 'largest')).toBe('Calibration, 50 % of it');
	});
	it('shows every part once in the drawing, and their sum', () => {
		const { drawing } = worked(reading);
		if (drawing?.kind !== 'budget') throw new Error('no budget is drawn');
		expect(drawing.parts.length).toBe(7);
		expect(Math.hypot(...drawing.parts.map((one) => one.contributionMm))).toBeCloseTo(
			drawing.standardMm,
			12
		);
	});
	it('leaves temperature out where none is given, and takes one reading', () => {
		const found = worked(reading, {
			readings: '39.99',
			partC: '',
			instrumentC: '',
			calibration: ''
		});
		expect(figure(found, 'expanded')).toBeCloseTo((2 * 0.001) / Math.sqrt(12), 9);
		expect(found.notes?.join()).toMatch(/three or more/);
		expect(text(found, 'largest')).toBe('Least count, 100 % of it');
	});
	it('says so where the readings are too few or all alike', () => {
		const two = worked(reading, { readings: '40 40.01', partC: '', instrumentC: '' });
		expect(figure(two, 'factor')).toBeCloseTo(12.71, 2);
		expect(two.notes?.join()).toMatch(/A few more readings/);
		expect(worked(reading, { readings: '40 40 40' }).notes?.join()).toMatch(/least count hides/);
	});
	it('refuses half a temperature and what no instrument is', () => {
		expect(refused(reading, { partC: '' })).toMatch(/temperatures of both/);
		expect(refused(reading, { leastCount: '0' })).toMatch(/least that makes sense/);
		expect(refused(reading, { readings: '-40' })).toMatch(/size is a number above zero/);
		expect(refused(reading, { readings: '40; x' })).toMatch(/no number/);
	});
});

describe('a reading against its limits', () => {
	it('works its example as by hand', () => {
		const found = worked(ruling);
		expect(text(found, 'ruling')).toBe('Too close to call');
		// (0.070 − 0.068) / 0.002 = 1; Φ(1) = 0.8413.
		expect(figure(found, 'conformance')).toBeCloseTo(84.13, 2);
		expect(figure(found, 'guard-band')).toBe(0.004);
		expect(figure(found, 'up-to')).toBeCloseTo(0.066, 12);
		expect(found.rulings?.map(({ ruling: one }) => one.ruling)).toEqual(['too-close']);
	});
	it('goes by the rule that is chosen, and names it', () => {
		const found = worked(ruling, { value: '0.0666', rule: 'one-sided-95' });
		expect(text(found, 'ruling')).toMatch(/^Within$/);
		expect(text(worked(ruling, { value: '0.0666' }), 'ruling')).toMatch(/^Too close/);
	});
	it('JCGM 106, three examples', () => {
		const { inputs, expected } = publishedIn<{
			inputs: { name: string; y: number; u: number; T_L?: number; T_U?: number }[];
			expected: Record<string, number>;
		}>('decision-risk.json')('conformance_probability_one_and_two_sided');
		for (const { name, y, u, T_L, T_U } of inputs) {
			const limit = (one: number | undefined) => (one === undefined ? '' : String(one));
			const found = worked(ruling, {
				value: String(y),
				expanded: String(2 * u),
				least: limit(T_L),
				most: limit(T_U)
			});
			expect(figure(found, 'conformance')).toBeCloseTo(100 * (expected[name] ?? NaN), 8);
		}
	});
	it('says where no reading at all could be within', () => {
		const found = worked(ruling, { expanded: '0.03' });
		expect(found.notes?.join()).toMatch(/no reading with this uncertainty/);
	});
	it('refuses a reading without a limit, and limits that cross', () => {
		expect(refused(ruling, { least: '', most: '' })).toMatch(/no limit/);
		expect(refused(ruling, { least: '0.08' })).toMatch(/lies above the most/);
	});
	it('takes limits from a data sheet, to build and to run again', () => {
		const presets = ruling.presets?.(av3) ?? [];
		const of = (key: string) => presets.find((one) => one.key === key)?.values;
		expect(of('crankpin.diameter/build')).toEqual({
			question: 'build',
			least: '39.980',
			most: '39.996'
		});
		expect(of('crankpin.diameter/run-again')).toEqual({
			question: 'run-again',
			least: '39.950',
			most: ''
		});
		for (const { values } of presets)
			expect(worked(ruling, values).lines.length, JSON.stringify(values)).toBeGreaterThan(3);
	});
});

describe('can this tool judge', () => {
	it('works its example as by hand', () => {
		const found = worked(whichTool);
		expect(text(found, 'fetch')).toBe('Fine micrometer');
		expect(figure(found, 'needed')).toBeCloseTo(0.002, 12);
		// 2 · √(0.0005² + 0.001²/12 + 0.00075²); 0.008 over it.
		const U = 2 * Math.hypot(0.0005, 0.001 / Math.sqrt(12), 0.00075);
		expect(figure(found, 'expanded')).toBeCloseTo(U, 12);
		expect(figure(found, 'ratio')).toBeCloseTo(0.008 / U, 9);
		expect(text(found, 'tool-1')).toMatch(/cannot call anything within/);
	});
	it('says whether repeats help', () => {
		const notes = worked(whichTool).notes?.join(' ') ?? '';
		expect(notes).toMatch(/Caliper: repeats do not help/);
		const scattered = 'Micrometer_0.001_0.001_0.0012';
		expect(worked(whichTool, { tools: scattered }).notes?.join()).toMatch(
			/Micrometer: the mean of \d readings would do/
		);
		const [, n] =
			/mean of (\d+)/.exec(worked(whichTool, { tools: scattered }).notes?.join() ?? '') ?? [];
		const again = worked(whichTool, { tools: scattered, readings: n ?? '' });
		expect(text(again, 'fetch')).toBe('Micrometer');
		expect(again.notes).toEqual([]);
		expect(worked(whichTool, { tools: 'Stick_1_1_' }).notes?.join()).toMatch(/not known/);
	});
	it('takes a single limit with the room inside it, from a data sheet too', () => {
		expect(refused(whichTool, { least: '' })).toMatch(/one limit alone has no width/);
		const values = whichTool
			.presets?.(av3)
			.find((one) => one.key === 'crankpin.diameter/run-again')?.values;
		expect(values).toEqual({ least: '39.950', most: '', room: '0.030' });
		expect(figure(worked(whichTool, values), 'needed')).toBeCloseTo(0.0075, 9);
	});
	it('refuses tools that are none', () => {
		expect(refused(whichTool, { tools: 'A_0__' })).toMatch(/above zero/);
		expect(refused(whichTool, { tools: 'A_0.1_-1_' })).toMatch(/zero or more/);
		expect(refused(whichTool, { tools: 'A_0.1__*A_0.2__' })).toMatch(/same name/);
		expect(refused(whichTool, { readings: '0' })).toMatch(/least that makes sense/);
		expect(refused(whichTool, { readings: '1.5' })).toMatch(/whole number/);
	});
});

describe('how well a group reads', () => {
	type Case = {
		inputs: { data_appraiser_trial_by_part: Record<string, number[][]> };
		expected: Record<string, Record<string, number> & Record<string, Record<string, number>>>;
	};
	const published = publishedIn<Case>('gauge-study.json');
	const pasted = ({ inputs }: Case) =>
		Object.entries(inputs.data_appraiser_trial_by_part)
			.flatMap(([name, trials]) => trials.map((row) => [name, ...row].join('_')))
			.join('*');
	it('aiag_average_and_range and aiag_anova, pasted as a table', () => {
		const [ranges, anova] = [published('aiag_average_and_range'), published('aiag_anova')];
		const limits = { least: '-3', most: '3' };
		const byRanges = worked(groupStudy, { readings: pasted(ranges), method: 'ranges', ...limits });
		const wanted = ranges.expected.with_exact_constants ?? {};
		expect(figure(byRanges, 'gauge')).toBeCloseTo(Number(wanted.GRR), 8);
		expect(figure(byRanges, 'categories')).toBe(wanted.ndc);
		expect(byRanges.notes?.join()).toMatch(/B, part 4: the repeats differ by 1\.020? mm/);
		const byAnova = worked(groupStudy, { readings: pasted(anova), method: 'anova', ...limits });
		const pooled = anova.expected.pooled_interaction ?? {};
		expect(figure(byAnova, 'gauge')).toBeCloseTo(pooled.sd?.GRR ?? NaN, 8);
		expect(figure(byAnova, 'tolerance')).toBeCloseTo(
			Number(pooled.pct_tolerance_GRR_for_tolerance_6),
			8
		);
		expect(figure(byAnova, 'categories')).toBe(pooled.ndc);
		// The same readings, two methods, two counts: the page says so.
		expect(byAnova.notes?.[0]).toMatch(/tell 5 sorts.+4 sorts/);
	});
	it('says what is wrong with a table that is no study', () => {
		expect(refused(groupStudy, { readings: 'Ana_1_2*Ana_1_3' })).toMatch(/two people or more/);
		expect(refused(groupStudy, { readings: 'Ana_1_2*Bo_1_3' })).toMatch(/twice or more/);
		expect(refused(groupStudy, { readings: 'Ana_1_2*Ana_1_2*Bo_1_2' })).toMatch(
			/Ana has 2, Bo has 1/
		);
		expect(refused(groupStudy, { readings: 'Ana_1_2*Ana_1_*Bo_1_2*Bo_1_2' })).toMatch(
			/Ana, part 2: a reading is missing/
		);
		expect(refused(groupStudy, { readings: 'Ana_1_2*Ana_1_2*Bo_1_2*Bo_1_2' })).toMatch(
			/finer step/
		);
		expect(refused(groupStudy, { most: '' })).toMatch(/both limits, or neither/);
		expect(refused(groupStudy, { least: '40' })).toMatch(/no width/);
	});
	it('puts rows of one name together, wherever they stand', () => {
		const rows = exampleEntries(groupStudy).readings?.text.split('*') ?? [];
		const mixed = [rows[0], rows[2], rows[4], rows[1], rows[3], rows[5]].join('*');
		expect(figure(worked(groupStudy, { readings: mixed }), 'gauge')).toBeCloseTo(
			figure(worked(groupStudy), 'gauge'),
			12
		);
	});
});
