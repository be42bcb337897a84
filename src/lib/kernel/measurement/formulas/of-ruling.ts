import type { Formula } from '../../formula';
import { conformanceProbability } from '../conformance';
import { decisionRisk } from '../decision-risk';
import { guardBandOf } from '../guard-band';
import { knownAfter } from '../known-before';
import { ruleReading } from '../ruling';
import { guardBandForRisk, riskAtGuardBand } from '../specific-risk';
import { inHandMm } from '../in-hand';
import { expandedFor, judgeTool } from '../tool';
import { from } from './from';

export const rulingFormulas: readonly Formula[] = [
	{
		id: 'measurement/ruling',
		works: ruleReading,
		formula: 'within: least + g ≤ x ≤ most − g; out: x < least − g or x > most + g',
		source: 'ISO 14253-1; g = U by the house’s rule',
		example: {
			says: 'the guard band of 0.068 ± 0.005 mm against at most 0.070',
			gives: () => {
				const found = ruleReading({
					question: 'run-again',
					value: 0.068,
					expandedUncertainty: 0.005,
					most: 0.07
				});
				return found.ok ? found.value.guardBand : found;
			},
			wanted: 0.005,
			within: 1e-9
		}
	},
	{
		id: 'measurement/guard-band',
		works: guardBandOf,
		formula: 'g = U, or 1.645 · U / 2',
		source: 'ISO 14253-1:2013 and :2017',
		example: {
			says: 'one-sided 95 % of U = 0.005 mm',
			gives: () => guardBandOf('one-sided-95', 0.005),
			wanted: 0.004112,
			within: 0.0000005
		}
	},
	{
		id: 'measurement/guard-band-for-risk',
		works: guardBandForRisk,
		formula: 'g = z · u with Φ(z) = 1 − risk',
		source: 'JCGM 106:2012, 8.3.2',
		example: {
			says: 'a risk of 5 %',
			gives: () => guardBandForRisk(0.05),
			wanted: 1.6449,
			within: 0.00005
		}
	},
	{
		id: 'measurement/risk-at-guard-band',
		works: riskAtGuardBand,
		formula: '1 − Φ(2 w / U)',
		source: 'JCGM 106:2012, 8.3.2; ILAC-G8:09/2019',
		example: { says: 'w = U', gives: () => riskAtGuardBand(1), wanted: 0.02275, within: 0.000005 }
	},
	{
		id: 'measurement/conformance',
		works: conformanceProbability,
		formula: 'p = Φ((most − y) / u) − Φ((least − y) / u)',
		source: 'JCGM 106:2012, 7.3 and 7.4',
		example: {
			says: '13.6 with u = 1.8 between 12.5 and 16.3',
			gives: () =>
				conformanceProbability({ value: 13.6, standardUncertainty: 1.8, least: 12.5, most: 16.3 }),
			wanted: 0.6626,
			within: 0.00005
		}
	},
	{
		id: 'measurement/known-after',
		works: knownAfter,
		formula: '1/s² = 1/s0² + 1/u²; m = s² (m0 / s0² + y / u²)',
		source: 'JCGM 106:2012, 6.2 and annex A',
		example: {
			says: '10.00 ± 0.03 before, 10.05 ± 0.02 read',
			gives: () =>
				from(
					knownAfter({ mean: 10, standard: 0.03 }, { mean: 10.05, standard: 0.02 }),
					({ mean }) => mean
				),
			wanted: 10.0346,
			within: 0.00005
		}
	},
	{
		id: 'measurement/decision-risk',
		works: decisionRisk,
		formula:
			'R_C = ∫ p(x) P(accept | x) dx over parts out; R_P = ∫ p(x) (1 − P(accept | x)) dx over parts within',
		source: 'JCGM 106:2012, 9.3 and 9.4',
		example: {
			says: 'bad resistors passed, limits 1500 ± 0.2, accepted within ± 0.18',
			gives: () =>
				from(
					decisionRisk({
						before: { mean: 1500, standard: 0.12 },
						standardUncertainty: 0.04,
						tolerance: { least: 1499.8, most: 1500.2 },
						acceptance: { least: 1499.82, most: 1500.18 }
					}),
					({ consumer }) => consumer
				),
			wanted: 0.00988,
			within: 0.000005
		}
	},
	{
		id: 'measurement/tool',
		works: judgeTool,
		formula: 'ratio = (most − least) / (2 U); for one limit room / U',
		source: 'ANSI/NCSL Z540.3-2006; ISO 14253-1',
		example: {
			says: 'U = 0.002 against 39.984 to 40.000 mm',
			gives: () => from(judgeTool(0.002, { least: 39.984, most: 40 }), ({ ratio }) => ratio),
			wanted: 4,
			within: 1e-9
		}
	},
	{
		id: 'measurement/expanded-for',
		works: expandedFor,
		formula: 'U = (most − least) / (2 · 4), for one limit room / 4',
		source: 'ANSI/NCSL Z540.3-2006 (4:1), solved for U',
		example: {
			says: 'for 39.984 to 40.000 mm',
			gives: () => expandedFor({ least: 39.984, most: 40 }),
			wanted: 0.002,
			within: 1e-9
		}
	},
	{
		id: 'measurement/in-hand',
		works: inHandMm,
		formula: 'U = 2 · √(s² / n + δ² / 12 + (U_cal / 2)²)',
		source: 'JCGM 100:2008 (GUM), 4.2.3, F.2.2.1 and 6.2.1',
		example: {
			says: 'one reading by 0.001 mm, calibrated to 0.002, scatter 0.001',
			gives: () => inHandMm({ leastCountMm: 0.001, calibrationMm: 0.002, scatterMm: 0.001 }, 1),
			wanted: 0.00289,
			within: 0.000005
		}
	}
];
