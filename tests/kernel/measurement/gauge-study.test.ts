import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { AnovaRow } from '$lib/kernel/measurement/gauge-study/anova-table';
import { studyByAnova, type AnovaStudy } from '$lib/kernel/measurement/gauge-study/by-anova';
import { studyByRanges } from '$lib/kernel/measurement/gauge-study/by-ranges';
import { percentOfTolerance, studyFigures } from '$lib/kernel/measurement/gauge-study/figures';
import { linearity } from '$lib/kernel/measurement/gauge-study/linearity';
import { studyMeaning } from '$lib/kernel/measurement/gauge-study/meaning';
import type { GaugeStudy } from '$lib/kernel/measurement/gauge-study/study';
import { meanRangeDivisor, rangeConstants } from '$lib/kernel/measurement/range-constants';
import type { Outcome } from '$lib/kernel/outcome';
import { expectNear, publishedIn } from '../statistics/published';

const value = <T>(outcome: Outcome<T>): T => {
	if (!outcome.ok) throw new Error(outcome.because);
	return outcome.value;
};
type Inputs = { data_appraiser_trial_by_part: Record<string, number[][]> };
const groupOf = ({ data_appraiser_trial_by_part: data }: Inputs): GaugeStudy => Object.values(data);

const published = publishedIn<{ inputs: Inputs; expected: Record<string, never> }>(
	'gauge-study.json'
);

describe('aiag_average_and_range: ten parts, three people, three trials', () => {
	type Wanted = Record<string, number> & {
		operator_means: Record<string, number>;
		operator_mean_ranges: Record<string, number>;
		part_means: number[];
		ranges_above_UCL: { part: number; range: number }[];
	};
	const { inputs, expected, tolerance, source } = published('aiag_average_and_range');
	it.each(['with_manual_constants', 'with_exact_constants'] as const)(`%s (${source})`, (which) => {
		const wanted = (expected as unknown as Record<string, Wanted>)[which] as Wanted;
		const { K1 = 0, K2 = 0, K3 = 0 } = wanted;
		// The limit of a range is published with D4 as printed, 2.574, in both.
		const factors = { k1: K1, k2: K2, k3: K3, d4: 2.574 };
		const exact = value(studyByRanges(groupOf(inputs)));
		const found = value(studyByRanges(groupOf(inputs), factors));
		const { figures } = which === 'with_exact_constants' ? exact : found;
		const pairs: [number, number | undefined][] = [
			[found.meanRange, wanted.R_double_bar],
			[found.meanDifference, wanted.X_diff],
			[found.partRange, wanted.Rp],
			[found.rangeLimit, wanted['UCL_R_D4_2.574']],
			[found.grandMean, wanted.grand_mean],
			[figures.repeatability, wanted.EV],
			[figures.reproducibility, wanted.AV],
			[figures.gauge, wanted.GRR],
			[figures.parts, wanted.PV],
			[figures.total, wanted.TV],
			[figures.percent.repeatability, wanted.pct_EV],
			[figures.percent.reproducibility, wanted.pct_AV],
			[figures.percent.gauge, wanted.pct_GRR],
			[figures.percent.parts, wanted.pct_PV],
			[figures.categoriesRaw, wanted.ndc_raw],
			[figures.categories, wanted.ndc]
		];
		for (const [one, other] of pairs) expectNear(one, other ?? Number.NaN, tolerance);
		const lists: [number[], number[]][] = [
			[found.personMeans, Object.values(wanted.operator_means)],
			[found.personMeanRanges, Object.values(wanted.operator_mean_ranges)],
			[found.partMeans, wanted.part_means]
		];
		for (const [some, others] of lists) {
			expect(some.length).toBe(others.length);
			some.forEach((one, at) => expectNear(one, others[at] as number, tolerance));
		}
		expect(found.overLimit.map(({ person, part }) => [person, part + 1])).toEqual([[1, 4]]);
		expectNear(
			found.overLimit[0]?.range ?? Number.NaN,
			wanted.ranges_above_UCL[0]?.range ?? Number.NaN,
			tolerance
		);
		if (which === 'with_exact_constants') {
			expectNear(exact.factors.k1, K1, tolerance);
			expectNear(exact.factors.k2, K2, tolerance);
			expectNear(exact.factors.k3, K3, tolerance);
		}
	});
});

describe('aiag_anova: the same readings by analysis of variance', () => {
	type Table = Record<'df' | 'SS' | 'MS' | 'F' | 'p', (number | null)[]> & {
		F_random_model?: (number | null)[];
		p_random_model?: (number | null)[];
	};
	type Part = Record<string, Record<string, number>> & Record<string, number>;
	const { inputs, expected, tolerance, source } = published('aiag_anova');
	const all = expected as unknown as Record<string, Table & Part>;
	const group = groupOf(inputs);

	function expectTable(rows: AnovaRow[], wanted: Table): void {
		expect(rows.length).toBe(wanted.df.length);
		rows.forEach((row, at) => {
			expect(row.df).toBe(wanted.df[at]);
			expectNear(row.sumOfSquares, wanted.SS[at] as number, tolerance);
			expectNear(row.meanSquare, wanted.MS[at] as number, tolerance);
			const f = wanted.F[at];
			if (f === null) return expect(row.f).toBeUndefined();
			expectNear(row.f ?? Number.NaN, f as number, tolerance);
			// Chances of 1e-53 would pass any absolute tolerance.
			expectNear(row.p ?? Number.NaN, wanted.p[at] as number, { rel: 1e-8 });
			if (!row.againstInteraction || !wanted.F_random_model) return;
			const { f: fi, p: pi } = row.againstInteraction;
			expectNear(fi, wanted.F_random_model[at] as number, tolerance);
			expectNear(pi, wanted.p_random_model?.[at] as number, { rel: 1e-8 });
		});
	}
	it(`the tables (${source})`, () => {
		const { part, person, interaction, residual } = value(studyByAnova(group, 'keep')).table;
		if (!interaction) throw new Error('it was kept');
		expectTable([part, person, interaction, residual], all.anova_with_interaction as Table);
		const pooled = value(studyByAnova(group, 'pool')).table;
		expect(pooled.interaction).toBeUndefined();
		expectTable([pooled.part, pooled.person, pooled.residual], all.anova_pooled as Table);
	});
	it.each([
		['pooled_interaction', 'pool'],
		['interaction_kept', 'keep']
	] as const)(`%s (${source})`, (which, interaction) => {
		const wanted = all[which] as Part;
		const { unclipped, variance, figures }: AnovaStudy = value(studyByAnova(group, interaction));
		const [raw, parts, sd] = ['variance_components_unclipped', 'variance', 'sd'].map(
			(key) => wanted[key] as unknown as Record<string, number>
		) as [Record<string, number>, Record<string, number>, Record<string, number>];
		const [share, study, six] = [
			'pct_contribution',
			'pct_study_variation',
			'study_variation_6sd'
		].map((key) => wanted[key] as unknown as Record<string, number>) as [
			Record<string, number>,
			Record<string, number>,
			Record<string, number>
		];
		const ofTotal = (one: number) => 100 * (one / figures.total) ** 2;
		const pairs: [number, number | undefined][] = [
			[unclipped.repeatability, raw.repeatability],
			[unclipped.interaction, raw.interaction],
			[unclipped.person, raw.operator],
			[unclipped.part, raw.part],
			[variance.repeatability, parts.repeatability],
			[variance.interaction, parts.interaction],
			[variance.person, parts.operator],
			[variance.part, parts.part],
			[figures.reproducibility ** 2, parts.reproducibility],
			[figures.gauge ** 2, parts.GRR],
			[figures.total ** 2, parts.total],
			[figures.repeatability, sd.EV],
			[Math.sqrt(variance.person), sd.AV_operator],
			[Math.sqrt(variance.interaction), sd.INT],
			[figures.reproducibility, sd.reproducibility],
			[figures.gauge, sd.GRR],
			[figures.parts, sd.PV],
			[figures.total, sd.TV],
			[ofTotal(figures.repeatability), share.EV],
			[ofTotal(figures.reproducibility), share.reproducibility],
			[ofTotal(figures.gauge), share.GRR],
			[ofTotal(figures.parts), share.PV],
			[figures.percent.repeatability, study.EV],
			[figures.percent.reproducibility, study.reproducibility],
			[figures.percent.gauge, study.GRR],
			[figures.percent.parts, study.PV],
			[6 * figures.repeatability, six.EV],
			[6 * figures.gauge, six.GRR],
			[6 * figures.parts, six.PV],
			[6 * figures.total, six.TV],
			[value(percentOfTolerance(figures.gauge, 6)), wanted.pct_tolerance_GRR_for_tolerance_6],
			[figures.categoriesRaw, wanted['ndc_raw_1.41']],
			[figures.categories, wanted.ndc],
			[(Math.SQRT2 * figures.parts) / figures.gauge, wanted.ndc_raw_sqrt2]
		];
		for (const [one, other] of pairs) expectNear(one, other ?? Number.NaN, tolerance);
	});
	it('pools an interaction that may well be chance, and says so', () => {
		const found = value(studyByAnova(group));
		expect(found.pooled).toBe(true);
		expect(found.crossed.interaction?.p).toBeGreaterThan(0.9);
		expect(found.figures).toEqual(value(studyByAnova(group, 'pool')).figures);
	});
});

describe('range_constants', () => {
	const { inputs, expected, tolerance, source } = published('range_constants');
	const wanted = expected as unknown as Record<string, number[]>;
	const sizes = (inputs as unknown as { n: number[] }).n;
	it.each(sizes.map((n, at) => [n, at] as const))(`of %i readings (${source})`, (n, at) => {
		const { d2, d3 } = rangeConstants(n);
		const star = meanRangeDivisor(n, 1);
		expectNear(d2, wanted.d2?.[at] as number, tolerance);
		expectNear(d3, wanted.d3?.[at] as number, tolerance);
		expectNear(star, wanted.d2_star_g1?.[at] as number, tolerance);
		expectNear(1 / d2, wanted.inverse_d2?.[at] as number, tolerance);
		expectNear(1 / star, wanted.inverse_d2_star_g1?.[at] as number, tolerance);
	});
	it('of two readings are 2/√π and √(2 − 4/π), by hand', () => {
		expect(rangeConstants(2).d2).toBeCloseTo(2 / Math.sqrt(Math.PI), 12);
		expect(rangeConstants(2).d3).toBeCloseTo(Math.sqrt(2 - 4 / Math.PI), 11);
	});
	it('are refused for what is no number of readings', () => {
		for (const bad of [1, 2.5, 101, Number.NaN])
			expect(() => rangeConstants(bad)).toThrow(RangeError);
		expect(() => meanRangeDivisor(3, 0)).toThrow(RangeError);
	});
});

describe('linearity_study', () => {
	const { inputs, expected, tolerance, source } = published('linearity_study');
	const { reference, measurements } = inputs as unknown as {
		reference: number[];
		measurements: number[][];
	};
	it(`five sizes, twelve readings each (${source})`, () => {
		const wanted = expected as unknown as Record<string, number> & { bias_means: number[] };
		const found = value(linearity(reference, measurements));
		const pairs: [number, number | undefined][] = [
			[found.slope, wanted.slope],
			[found.intercept, wanted.intercept],
			[found.rSquared, wanted.r_squared],
			[found.deviation, wanted.s],
			[found.tSlope, wanted.t_slope],
			[found.tIntercept, wanted.t_intercept],
			[found.df, wanted.df],
			...found.biasMeans.map((one, at): [number, number | undefined] => [
				one,
				wanted.bias_means[at]
			])
		];
		for (const [one, other] of pairs) expectNear(one, other ?? Number.NaN, tolerance);
		expectNear(found.pSlope, wanted.p_slope ?? Number.NaN, { rel: 1e-8 });
	});
	it('refuses what makes no line', () => {
		expect(linearity([2], [[2, 2.1, 2.2]]).ok).toBe(false);
		expect(linearity([2, 4], [[2.1], [4.1]]).ok).toBe(false);
		expect(linearity([2, 4], [[2.1, 2.1], []]).ok).toBe(false);
		expect(linearity([2, 4], [[2.1, Number.NaN], [4.1]]).ok).toBe(false);
		expect(
			linearity(
				[2, 4],
				[
					[2, 2],
					[4, 4]
				]
			).ok
		).toBe(false);
		expect(linearity([1e300, -1e300], [[1e308, -1e308], [1e308]]).ok).toBe(false);
	});
});

const reading = fc.integer({ min: 39_900, max: 40_100 }).map((one) => one / 1000);
const study = fc
	.tuple(
		fc.integer({ min: 2, max: 4 }),
		fc.integer({ min: 2, max: 4 }),
		fc.integer({ min: 2, max: 6 })
	)
	.chain(([people, trials, parts]) => {
		const row = fc.array(reading, { minLength: parts, maxLength: parts });
		const one = fc.array(row, { minLength: trials, maxLength: trials });
		return fc.array(one, { minLength: people, maxLength: people });
	});
const ways = { ranges: studyByRanges, anova: studyByAnova };

describe.each(Object.entries(ways))('any study by %s', (_, of) => {
	it('gives the same in micrometres', () => {
		fc.assert(
			fc.property(study, (group) => {
				const found = of(group);
				const scaled = of(group.map((one) => one.map((row) => row.map((x) => x * 1000))));
				expect(scaled.ok).toBe(found.ok);
				if (!found.ok || !scaled.ok) return;
				const [a, b] = [found.value.figures, scaled.value.figures];
				expect(b.gauge / 1000).toBeCloseTo(a.gauge, 9);
				expect(b.percent.gauge).toBeCloseTo(a.percent.gauge, 5);
			})
		);
	});
	it('does not care who is asked first, nor which part', () => {
		fc.assert(
			fc.property(study, (group) => {
				const found = of(group);
				const turned = of(group.toReversed().map((one) => one.map((row) => row.toReversed())));
				expect(turned.ok).toBe(found.ok);
				if (found.ok && turned.ok)
					expect(turned.value.figures.gauge).toBeCloseTo(found.value.figures.gauge, 9);
			})
		);
	});
	it('adds up, and nothing lies below zero', () => {
		fc.assert(
			fc.property(study, (group) => {
				const found = of(group);
				if (!found.ok) return;
				const { repeatability, reproducibility, gauge, parts, total, categories } =
					found.value.figures;
				expect(Math.hypot(repeatability, reproducibility)).toBeCloseTo(gauge, 12);
				expect(Math.hypot(gauge, parts)).toBeCloseTo(total, 12);
				expect(Math.min(repeatability, reproducibility, parts, categories)).toBeGreaterThanOrEqual(
					0
				);
			})
		);
	});
	it('refuses what is no study', () => {
		const refused: GaugeStudy[] = [
			[],
			[
				[
					[1, 2],
					[1, 3]
				]
			],
			[[[1, 2]], [[1, 3]]],
			[
				[[1], [2]],
				[[1], [3]]
			],
			[
				[
					[1, 2],
					[1, 3]
				],
				[[1, 2], [1]]
			],
			[
				[
					[1, 2],
					[1, 3]
				],
				[[1, 2]]
			],
			[
				[
					[1, Number.NaN],
					[1, 3]
				],
				[
					[1, 2],
					[1, 3]
				]
			],
			[
				[
					[1, 1e200],
					[1, 3]
				],
				[
					[1, 2],
					[1, 3]
				]
			],
			// Nobody's readings differ.
			[
				[
					[1, 2],
					[1, 2]
				],
				[
					[1, 2],
					[1, 2]
				]
			]
		];
		for (const one of refused) {
			const found = of(one);
			expect(found.ok).toBe(false);
			if (!found.ok) expect(found.because.length).toBeGreaterThan(15);
		}
	});
});

describe('what a study means', () => {
	const figures = value(studyFigures(0.003, 0.004, 0.02));
	it('for a ruling: a guard band of two deviations, and 2.8 between two people', () => {
		const found = value(studyMeaning(figures, 0.3));
		expect(found.expanded).toBeCloseTo(0.01, 12);
		expect(found.apart / 0.005).toBeCloseTo(2.77, 2);
		expect(found.mend).toBe('people');
		expect(found.percentOfTolerance).toBeCloseTo(10, 9);
	});
	it.each([
		[0.31, 'fit'],
		[0.3, 'may-do'],
		[0.101, 'may-do'],
		[0.099, 'unfit']
	] as const)('limits %s mm apart: %s', (width, verdict) => {
		expect(value(studyMeaning(figures, width)).verdict).toBe(verdict);
	});
	it('goes by the study’s own variation where there are no limits', () => {
		expect(value(studyMeaning(figures)).verdict).toBe('may-do');
		expect(value(studyMeaning(figures)).percentOfTolerance).toBeUndefined();
		expect(studyMeaning(figures, 0).ok).toBe(false);
		expect(studyMeaning(figures, Number.NaN).ok).toBe(false);
		expect(percentOfTolerance(-1, 1).ok).toBe(false);
		expect(studyFigures(-1, 0, 1).ok).toBe(false);
		expect(studyFigures(Number.NaN, 0, 1).ok).toBe(false);
	});
});
