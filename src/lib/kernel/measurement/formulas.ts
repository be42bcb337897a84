import type { Formula } from '../formula';
import { ruleReading } from './ruling';
import { expandedMm, ofDifferenceMm, standardUncertaintyMm } from './uncertainty';

export const measurementFormulas: readonly Formula[] = [
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
		id: 'measurement/ruling',
		works: ruleReading,
		formula: 'within: least + U ≤ x ≤ most − U; out: x < least − U or x > most + U',
		source: 'ISO 14253-1, guard band g = U',
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
	}
];
