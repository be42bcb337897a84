import type { Formula } from '../../formula';
import { computed, type Outcome } from '../../outcome';
import { bankedThrowDeg, evenThrowsDeg } from '../crank-throws';
import { evenIntervalDeg, firingsOf } from '../firing';

const part = <T>(found: Outcome<T>, of: (value: T) => number): Outcome<number> =>
	found.ok ? computed(of(found.value)) : found;

export const firingFormulas: readonly Formula[] = [
	{
		id: 'cylinder/even-interval',
		works: evenIntervalDeg,
		formula: 'four-stroke 720° / n, two-stroke 360° / n',
		source: 'definition',
		example: {
			says: 'three cylinders, four-stroke',
			gives: () => evenIntervalDeg(3, 'four-stroke'),
			wanted: 240,
			within: 1e-9
		}
	},
	{
		id: 'cylinder/firings',
		works: firingsOf,
		formula:
			'each fires when its throw stands at top dead centre: the next such angle after the one before',
		source: 'geometry of the crank',
		example: {
			says: 'an in-line four, 1-3-4-2: from the first to the second firing',
			gives: () =>
				part(
					firingsOf([0, 180, 180, 0], [1, 3, 4, 2], 'four-stroke'),
					(all) => all[0]?.toNextDeg ?? 0
				),
			wanted: 180,
			within: 1e-9
		}
	},
	{
		id: 'cylinder/even-throws',
		works: evenThrowsDeg,
		formula: 'place p in the order fires at p · interval; its throw is that angle less whole turns',
		source: 'geometry of the crank',
		example: {
			says: 'an in-line four, 1-3-4-2: the throw of cylinder 3, degrees',
			gives: () => part(evenThrowsDeg([1, 3, 4, 2], 'four-stroke'), (all) => all[2] ?? 0),
			wanted: 180,
			within: 1e-9
		}
	},
	{
		id: 'cylinder/banked-throw',
		works: bankedThrowDeg,
		formula: 'φ = pin + bank, less whole turns',
		source: 'geometry of the crank',
		example: {
			says: 'a pin 330° behind in a bank that leans 90° on, degrees',
			gives: () => bankedThrowDeg(330, 90),
			wanted: 60,
			within: 1e-9
		}
	}
];
