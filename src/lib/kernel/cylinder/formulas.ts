import type { Formula } from '../formula';
import { displacementCm3 } from './displacement';

export const cylinderFormulas: readonly Formula[] = [
	{
		id: 'cylinder/displacement',
		works: displacementCm3,
		formula: 'V = n · π/4 · B² · S',
		source: 'definition; NAVEDTRA 14075',
		example: {
			says: 'three cylinders, bore 74.0 mm, stroke 89.1 mm, cm³',
			gives: () => displacementCm3(74, 89.1, 3),
			wanted: 1149.6,
			within: 0.05
		}
	}
];
