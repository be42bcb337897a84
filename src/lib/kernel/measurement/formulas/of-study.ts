import type { Formula } from '../../formula';
import { expectedSpread, trueSpread } from '../expected-spread';
import { studyByAnova } from '../gauge-study/by-anova';
import { studyByRanges } from '../gauge-study/by-ranges';
import { percentOfTolerance, studyFigures } from '../gauge-study/figures';
import { linearity } from '../gauge-study/linearity';
import { studyMeaning } from '../gauge-study/meaning';
import { meanRangeDivisor, rangeConstants } from '../range-constants';
import { from } from './from';

const pair = [
	[
		[2.0, 2.4],
		[2.1, 2.5]
	],
	[
		[2.0, 2.4],
		[2.0, 2.5]
	]
];

export const studyFormulas: readonly Formula[] = [
	{
		id: 'measurement/range-constants',
		works: rangeConstants,
		formula:
			'P(W > w) = 1 − n ∫ φ(x) (Φ(x + w) − Φ(x))^(n−1) dx; d2 = ∫ P dw; d3² = ∫ 2 w P dw − d2²',
		source: 'L. H. C. Tippett, Biometrika 17 (1925), 364',
		example: {
			says: 'd2 of three readings',
			gives: () => rangeConstants(3).d2,
			wanted: 1.693,
			within: 0.0005
		}
	},
	{
		id: 'measurement/mean-range-divisor',
		works: meanRangeDivisor,
		formula: 'd2* = √(d2² + d3² / g)',
		source: 'A. J. Duncan (1955); AIAG, Measurement Systems Analysis (2010), appendix C',
		example: {
			says: 'one spread of three readings',
			gives: () => meanRangeDivisor(3, 1),
			wanted: 1.91155,
			within: 0.00005
		}
	},
	{
		id: 'measurement/expected-spread',
		works: expectedSpread,
		formula: 'E = ∫ (1 − Π Φ((x − mᵢ)/u) − Π Φ((mᵢ − x)/u)) dx',
		source: 'H. A. David and H. N. Nagaraja, Order Statistics (2003), 3.1',
		example: {
			says: 'a round pin read at two places with u = 0.003: 2 u / √π',
			gives: () => expectedSpread([40, 40], 0.003),
			wanted: 0.003385,
			within: 0.0000005
		}
	},
	{
		id: 'measurement/true-spread',
		works: trueSpread,
		formula: 'δ with E(δ) = R',
		source: 'expectedSpread solved for δ',
		example: {
			says: '0.003385 mm read at two places, u = 0.003: all of it is added',
			gives: () => from(trueSpread(0.003385, 2, 0.003), ({ added }) => added),
			wanted: 0.003385,
			within: 0.00005
		}
	},
	{
		id: 'measurement/study-figures',
		works: studyFigures,
		formula:
			'GRR² = EV² + AV²; TV² = GRR² + PV²; % = 100 · each / TV; categories = ⌊1.41 PV / GRR⌋',
		source: 'AIAG, Measurement Systems Analysis (2010), chapter III section B',
		example: {
			says: 'GRR of EV 0.20188 and AV 0.22963',
			gives: () => from(studyFigures(0.20188, 0.22963, 1.10456), ({ gauge }) => gauge),
			wanted: 0.30575,
			within: 0.00001
		}
	},
	{
		id: 'measurement/percent-of-tolerance',
		works: percentOfTolerance,
		formula: '100 · 6 · GRR / (most − least)',
		source: 'AIAG, Measurement Systems Analysis (2010), chapter III section B',
		example: {
			says: 'GRR 0.3024 of a width of 6',
			gives: () => percentOfTolerance(0.3024, 6),
			wanted: 30.24,
			within: 1e-6
		}
	},
	{
		id: 'measurement/study-by-ranges',
		works: studyByRanges,
		formula: 'EV = R̄ · K1; AV² = (X̄diff · K2)² − EV² / (n r); PV = Rp · K3',
		source: 'AIAG, Measurement Systems Analysis (2010), chapter III section B',
		example: {
			says: 'EV of two people, two trials, two parts with R̄ = 0.075: 0.075 / 1.128',
			gives: () => from(studyByRanges(pair), ({ figures }) => figures.repeatability),
			wanted: 0.06647,
			within: 0.000005
		}
	},
	{
		id: 'measurement/study-by-anova',
		works: studyByAnova,
		formula:
			'σ²repeat = MS_e; σ²inter = (MS_pi − MS_e) / r; σ²person = (MS_o − MS_pi) / (n r); σ²part = (MS_p − MS_pi) / (k r)',
		source: 'AIAG, Measurement Systems Analysis (2010), chapter III section B',
		example: {
			says: 'EV of the same, interaction kept: √(0.015 / 4)',
			gives: () => from(studyByAnova(pair, 'keep'), ({ figures }) => figures.repeatability),
			wanted: 0.0612,
			within: 0.00005
		}
	},
	{
		id: 'measurement/study-meaning',
		works: studyMeaning,
		formula: 'apart = 1.96 · √2 · GRR; U = 2 · GRR',
		source:
			'ISO 5725-6:1994, 4.1.4; AIAG, Measurement Systems Analysis (2010), chapter II section D',
		example: {
			says: 'apart, for GRR = 0.005 mm',
			gives: () => from(from(studyFigures(0.003, 0.004, 0.02), studyMeaning), ({ apart }) => apart),
			wanted: 0.01386,
			within: 0.000005
		}
	},
	{
		id: 'measurement/linearity',
		works: linearity,
		formula: 'b = Σ (x − x̄)(y − ȳ) / Σ (x − x̄)²; a = ȳ − b x̄; y = reading − reference',
		source: 'AIAG, Measurement Systems Analysis (2010), chapter III section B',
		example: {
			says: 'slope of 2.7 and 2.5 read at 2, 4.6 and 4.4 at 4',
			gives: () =>
				from(
					linearity(
						[2, 4],
						[
							[2.7, 2.5],
							[4.6, 4.4]
						]
					),
					({ slope }) => slope
				),
			wanted: -0.05,
			within: 1e-6
		}
	}
];
