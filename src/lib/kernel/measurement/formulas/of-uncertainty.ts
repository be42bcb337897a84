import type { Formula } from '../../formula';
import { uncertaintyBudget } from '../budget';
import { combinedStandard } from '../combined';
import type { Component } from '../component';
import { coverageFactor95, effectiveDegrees } from '../effective-degrees';
import { ofPowerProduct } from '../power-product';
import { ofMean, repeatsNeeded, repeatsOf } from '../repeats';
import { ofHalfWidth, ofLeastCount, temperatureComponents } from '../sources-of-uncertainty';
import { expandedMm, ofDifferenceMm, standardUncertaintyMm } from '../uncertainty';
import { from } from './from';

const part = (standard: number, sensitivity: number, degreesOfFreedom = Infinity): Component => ({
	name: 'part',
	type: 'B',
	standard,
	sensitivity,
	degreesOfFreedom
});
const steel = {
	expansionPerK: 11.5e-6,
	temperatureC: 20,
	temperatureWithinC: 2,
	expansionWithinPerK: 0
};

export const uncertaintyFormulas: readonly Formula[] = [
	{
		id: 'measurement/standard-uncertainty',
		works: standardUncertaintyMm,
		formula: 'u² = (least count)² / 12 + (U_cal / 2)²',
		source: 'JCGM 100:2008 (GUM), 4.3.7 and F.2.2.1',
		example: {
			says: 'least count 0.01 mm, calibration 0.002 mm',
			gives: () => standardUncertaintyMm(0.01, 0.002),
			wanted: 0.00306,
			within: 0.00002
		}
	},
	{
		id: 'measurement/of-difference',
		works: ofDifferenceMm,
		formula: 'u² = a² + b²',
		source: 'JCGM 100:2008, 5.1.2 with sensitivities +1 and −1',
		example: {
			says: '0.003 and 0.004 mm',
			gives: () => ofDifferenceMm(0.003, 0.004),
			wanted: 0.005,
			within: 1e-9
		}
	},
	{
		id: 'measurement/expanded',
		works: expandedMm,
		formula: 'U = k · u, k = 2',
		source: 'JCGM 100:2008, 6.2.1',
		example: { says: '0.005 mm', gives: () => expandedMm(0.005), wanted: 0.01, within: 1e-9 }
	},
	{
		id: 'measurement/combined-standard',
		works: combinedStandard,
		formula: 'u² = Σ cᵢ² uᵢ² + 2 Σ cᵢ cⱼ uᵢ uⱼ r(i, j)',
		source: 'JCGM 100:2008 (GUM), 5.1.2 and 5.2.2',
		example: {
			says: 'a bore of 0.003 less a pin of 0.004 mm',
			gives: () => combinedStandard([part(0.003, 1), part(0.004, -1)]),
			wanted: 0.005,
			within: 1e-9
		}
	},
	{
		id: 'measurement/effective-degrees',
		works: effectiveDegrees,
		formula: 'ν = u⁴ / Σ (cᵢ uᵢ)⁴ / νᵢ',
		source: 'JCGM 100:2008 (GUM), G.4.1',
		example: {
			says: 'five readings of u = 0.003 beside a calibration of 0.004 mm',
			gives: () => effectiveDegrees([part(0.003, 1, 4), part(0.004, 1)]),
			wanted: 30.86,
			within: 0.005
		}
	},
	{
		id: 'measurement/coverage-factor',
		works: coverageFactor95,
		formula: 'k = t with 97.5 % below, for ν degrees of freedom',
		source: 'JCGM 100:2008 (GUM), G.3, table G.2',
		example: {
			says: 'four degrees of freedom',
			gives: () => coverageFactor95(4),
			wanted: 2.78,
			within: 0.005
		}
	},
	{
		id: 'measurement/budget',
		works: uncertaintyBudget,
		formula: 'U = k · u; k = t for ⌊ν⌋ degrees of freedom, at least 2',
		source: 'JCGM 100:2008 (GUM), 6.2.1, 6.3.3, G.4.1',
		example: {
			says: 'a least count of 0.01 mm alone',
			gives: () => from(uncertaintyBudget([part(0.00289, 1)]), ({ expanded }) => expanded),
			wanted: 0.00578,
			within: 0.000005
		}
	},
	{
		id: 'measurement/repeats',
		works: repeatsOf,
		formula: 's² = Σ (xᵢ − x̄)² / (n − 1); u = s / √n',
		source: 'JCGM 100:2008 (GUM), 4.2',
		example: {
			says: 'u of 74.012, 74.014 and 74.013 mm',
			gives: () => from(repeatsOf([74.012, 74.014, 74.013]), ({ standard }) => standard),
			wanted: 0.000577,
			within: 0.0000005
		}
	},
	{
		id: 'measurement/of-mean',
		works: ofMean,
		formula: 'u² = s² / n + b²',
		source: 'JCGM 100:2008 (GUM), 4.2.3 and F.2.4',
		example: {
			says: 'four readings of scatter 0.004, 0.003 shared',
			gives: () => ofMean(0.004, 0.003, 4),
			wanted: 0.003606,
			within: 0.0000005
		}
	},
	{
		id: 'measurement/repeats-needed',
		works: repeatsNeeded,
		formula: 'n = ⌈s² / (u² − b²)⌉',
		source: 'JCGM 100:2008 (GUM), 4.2.3 and F.2.4',
		example: {
			says: 'to bring 0.004 and 0.003 shared to 0.0036 mm',
			gives: () => repeatsNeeded(0.004, 0.003, 0.0036),
			wanted: 5,
			within: 0
		}
	},
	{
		id: 'measurement/of-least-count',
		works: ofLeastCount,
		formula: 'u = δ / √12',
		source: 'JCGM 100:2008 (GUM), F.2.2.1',
		example: { says: '0.01 mm', gives: () => ofLeastCount(0.01), wanted: 0.00289, within: 0.000005 }
	},
	{
		id: 'measurement/of-half-width',
		works: ofHalfWidth,
		formula: 'u = a / √3',
		source: 'JCGM 100:2008 (GUM), 4.3.7',
		example: {
			says: '2 °C either way',
			gives: () => ofHalfWidth(2),
			wanted: 1.1547,
			within: 0.00005
		}
	},
	{
		id: 'measurement/temperature',
		works: temperatureComponents,
		formula:
			'L20 = L (1 + αs (Ts − 20) − αp (Tp − 20)); c = L αs, −L αp, L (Ts − 20), −L (Tp − 20)',
		source: 'JCGM 100:2008 (GUM), 5.1.3; ISO 1:2022',
		example: {
			says: 'what 2 °C either way in a steel part of 80 mm add',
			gives: () =>
				from(
					temperatureComponents(80, steel, steel),
					([part]) => Math.abs(part?.sensitivity ?? 0) * (part?.standard ?? 0)
				),
			wanted: 0.001062,
			within: 0.0000005
		}
	},
	{
		id: 'measurement/power-product',
		works: ofPowerProduct,
		formula: '(u / y)² = Σ (pᵢ uᵢ / xᵢ)²',
		source: 'JCGM 100:2008 (GUM), 5.1.6',
		example: {
			says: 'u of 10 ± 0.1 over 2 ± 0.02',
			gives: () =>
				from(
					ofPowerProduct([
						{ value: 10, standard: 0.1, power: 1 },
						{ value: 2, standard: 0.02, power: -1 }
					]),
					({ standard }) => standard
				),
			wanted: 0.07071,
			within: 0.000005
		}
	}
];
