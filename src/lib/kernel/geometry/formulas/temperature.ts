import type { Formula } from '../../formula';
import { perFahrenheit } from '../expansion';
import { at20Mm, growthApartMm, growthMm, readingOfMm } from '../temperature';
import { gapClosedMm, riseToGrowK, warmClearanceMm } from '../thermal-growth';

const firstOrder = 'definition of linear expansion, first order';
const toTwenty = 'ISO 1:2022 (20 °C); first order in the expansions';
const ironBore = { expansionPerK: 10.8e-6, temperatureC: 35 };
const steelInstrument = { expansionPerK: 11.5e-6, temperatureC: 20 };
const iron = { expansionPerK: 10.8e-6, riseK: 60 };
const piston = { expansionPerK: 20e-6, riseK: 60 };

/** What warmth does to sizes and to what measures them. */
export const temperatureFormulas: readonly Formula[] = [
	{
		id: 'geometry/growth',
		works: growthMm,
		formula: 'ΔL = L · α · ΔT',
		source: firstOrder,
		example: {
			says: '74 mm of aluminium alloy, 15 K warmer',
			gives: () => growthMm(74, { expansionPerK: 23e-6, riseK: 15 }),
			wanted: 0.0255,
			within: 0.00005
		}
	},
	{
		id: 'geometry/growth-apart',
		works: growthApartMm,
		formula: 'Δ = L · (αo · ΔTo − αi · ΔTi)',
		source: firstOrder,
		example: {
			says: 'an aluminium piston in an iron bore of 80 mm, both 60 K warmer',
			gives: () => growthApartMm(80, iron, piston),
			wanted: -0.0442,
			within: 0.00005
		}
	},
	{
		id: 'geometry/at-20',
		works: at20Mm,
		formula: 'L20 = L · (1 + αs · (Ts − 20) − αp · (Tp − 20))',
		source: toTwenty,
		example: {
			says: 'an iron bore of 35 °C read as 74.020 mm by a steel instrument of 20 °C',
			gives: () => at20Mm(74.02, ironBore, steelInstrument),
			wanted: 74.008,
			within: 0.0005
		}
	},
	{
		id: 'geometry/reading-of',
		works: readingOfMm,
		formula: 'L = L20 / (1 + αs · (Ts − 20) − αp · (Tp − 20))',
		source: toTwenty,
		example: {
			says: 'the same bore of 74.008 mm at 20 °C, as that instrument reads it',
			gives: () => readingOfMm(74.008, ironBore, steelInstrument),
			wanted: 74.02,
			within: 0.0005
		}
	},
	{
		id: 'geometry/warm-clearance',
		works: warmClearanceMm,
		formula: 'C = C20 + L · (αo · ΔTo − αi · ΔTi)',
		source: firstOrder,
		example: {
			says: '0.060 mm cold, the piston and bore above',
			gives: () => warmClearanceMm(0.06, 80, iron, piston),
			wanted: 0.0158,
			within: 0.00005
		}
	},
	{
		id: 'geometry/gap-closed',
		works: gapClosedMm,
		formula: 'Δg = π · D · (αr · ΔTr − αb · ΔTb)',
		source: firstOrder,
		example: {
			says: 'an iron ring 150 K warmer in a bore of 86 mm that is 80 K warmer',
			gives: () => gapClosedMm(86, { ...iron, riseK: 150 }, { ...iron, riseK: 80 }),
			wanted: 0.204,
			within: 0.0005
		}
	},
	{
		id: 'geometry/rise-to-grow',
		works: riseToGrowK,
		formula: 'ΔT = g / (L · α)',
		source: firstOrder,
		example: {
			says: '0.06 mm on an aluminium housing of 62 mm',
			gives: () => riseToGrowK(0.06, 62, 23e-6),
			wanted: 42.1,
			within: 0.05
		}
	},
	{
		id: 'geometry/per-fahrenheit',
		works: perFahrenheit,
		formula: 'αF = αK / 1.8',
		source: 'NIST SP 811 (2008), B.8: a difference of 1 °F is 1/1.8 K',
		example: {
			says: 'grey cast iron, 10.8e-6 a kelvin',
			gives: () => perFahrenheit(10.8e-6),
			wanted: 6.0e-6,
			within: 0.05e-6
		}
	}
];
