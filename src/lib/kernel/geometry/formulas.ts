import type { Formula } from '../formula';
import { outOfRoundMm, taperMm } from './diameter-grid';
import { oilClearance } from './oil-clearance';
import { at20Mm, growthApartMm } from './temperature';
import { wearMm } from './wear';

const twoPlanes =
	'method as in US Army TM 5-3805-262-34, p. 4-24 (second reading 90° from the first)';
const pin = [
	[40.0, 39.988],
	[39.993, 39.985]
];

export const geometryFormulas: readonly Formula[] = [
	{
		id: 'geometry/out-of-round',
		works: outOfRoundMm,
		formula: 'max over depths of (largest − smallest of the planes)',
		source: twoPlanes,
		example: {
			says: 'a pin of 40.000, 39.988 and 39.993, 39.985 mm',
			gives: () => outOfRoundMm(pin),
			wanted: 0.012,
			within: 1e-6
		}
	},
	{
		id: 'geometry/taper',
		works: taperMm,
		formula: 'max over planes of (largest − smallest of the depths)',
		source: twoPlanes,
		example: {
			says: 'the same pin',
			gives: () => taperMm(pin),
			wanted: 0.007,
			within: 1e-6
		}
	},
	{
		id: 'geometry/oil-clearance',
		works: oilClearance,
		formula: 'least = smallest bore − largest pin; most = largest bore − smallest pin',
		source: 'definition; NAVEDTRA 14075 (bore less journal)',
		example: {
			says: 'most, the same pin in a bore of 40.030 to 40.036 mm',
			gives: () => {
				const found = oilClearance([[40.03, 40.036]], pin);
				return found.ok ? found.value.mostMm : found;
			},
			wanted: 0.051,
			within: 1e-6
		}
	},
	{
		id: 'geometry/wear',
		works: wearMm,
		formula: 'bore: measured − printed; journal: printed − measured; nothing below zero',
		source: 'definition',
		example: {
			says: 'a bore of 74.052 mm, printed at most 74.010',
			gives: () => wearMm('bore', 74.052, 74.01),
			wanted: 0.042,
			within: 1e-6
		}
	},
	{
		id: 'geometry/growth-apart',
		works: growthApartMm,
		formula: 'Δ = L · (αo · ΔTo − αi · ΔTi)',
		source: 'definition of linear expansion, first order',
		example: {
			says: 'an aluminium piston in an iron bore of 80 mm, both 60 K warmer',
			gives: () =>
				growthApartMm(
					80,
					{ expansionPerK: 10.8e-6, riseK: 60 },
					{ expansionPerK: 20e-6, riseK: 60 }
				),
			wanted: -0.0442,
			within: 0.00005
		}
	},
	{
		id: 'geometry/at-20',
		works: at20Mm,
		formula: 'L20 = L · (1 + αs · (Ts − 20) − αp · (Tp − 20))',
		source: 'ISO 1:2022 (20 °C); first order in the expansions',
		example: {
			says: 'an iron bore of 35 °C read as 74.020 mm by a steel instrument of 20 °C',
			gives: () =>
				at20Mm(
					74.02,
					{ expansionPerK: 10.8e-6, temperatureC: 35 },
					{ expansionPerK: 11.5e-6, temperatureC: 20 }
				),
			wanted: 74.008,
			within: 0.0005
		}
	}
];
