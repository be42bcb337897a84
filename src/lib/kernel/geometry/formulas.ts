import type { Formula } from '../formula';
import { outOfRoundMm, taperMm } from './diameter-grid';
import { faceFormulas } from './formulas/faces';
import { temperatureFormulas } from './formulas/temperature';
import { valveFormulas } from './formulas/valves';
import { oilClearance } from './oil-clearance';
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
	...temperatureFormulas,
	...faceFormulas,
	...valveFormulas
];
