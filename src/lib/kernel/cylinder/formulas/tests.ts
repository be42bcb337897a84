import type { Formula } from '../../formula';
import { computed, type Outcome } from '../../outcome';
import { compressionBalance } from '../compression-test';
import { blowByPerHour, leakBand, leakPercent, vacuumDropInHg } from '../leak-down';
import { wetTest } from '../wet-test';

const part = <T>(found: Outcome<T>, of: (value: T) => number): Outcome<number> =>
	found.ok ? computed(of(found.value)) : found;

/** Tests of a cylinder that is still together. */
export const testFormulas: readonly Formula[] = [
	{
		id: 'cylinder/compression-balance',
		works: compressionBalance,
		formula:
			'0.75 · highest; 0.70 · highest but 100 psi at least; 0.80 · mean; highest − 10 psi; highest − 100 psi',
		source:
			'US Army TM 5-4210-230-14&P, TM 1-1500-204-23-1, TM 10-3930-618-20, TM 5-2420-230-24-2, by rule',
		example: {
			says: '10.3, 10.0, 10.2 and 7.4 bar by 75 % of the highest: least allowed, bar',
			gives: () =>
				part(compressionBalance([10.3, 10, 10.2, 7.4], '75-of-highest'), (one) => one.allowedBar),
			wanted: 7.725,
			within: 0.0005
		}
	},
	{
		id: 'cylinder/wet-test',
		works: wetTest,
		formula: 'rise = (wet − dry) / dry',
		source:
			'US Army TM 5-4210-230-14&P addendum 2, step 7; what counts as clear is common practice',
		example: {
			says: '7.4 bar dry, 9.5 bar wet',
			gives: () => part(wetTest(7.4, 9.5), (one) => one.rise),
			wanted: 0.284,
			within: 0.0005
		}
	},
	{
		id: 'cylinder/leak',
		works: leakPercent,
		formula: 'leak = 100 % · (p − c) / p',
		source: 'FAA AC 43.13-1B, para 8-14',
		example: {
			says: '66 of 80 psi, %',
			gives: () => leakPercent(80, 66),
			wanted: 17.5,
			within: 0.001
		}
	},
	{
		id: 'cylinder/leak-band',
		works: leakBand,
		formula: 'suspect where the cylinder holds less than 75 % of what it is given',
		source: 'FAA AC 43.13-1B, para 8-14 (60 of 80 psi); bands trade-wide, no source',
		example: {
			says: 'a leak of 26 %: 1 is suspect',
			gives: () => part(leakBand(26), (one) => Number(one.suspect)),
			wanted: 1,
			within: 0.001
		}
	},
	{
		id: 'cylinder/blow-by',
		works: blowByPerHour,
		formula: 'rate = volume · 60 / minutes',
		source: 'definition',
		example: {
			says: '15 ft³ in 5 minutes',
			gives: () => blowByPerHour(15, 5),
			wanted: 180,
			within: 0.01
		}
	},
	{
		id: 'cylinder/vacuum-drop',
		works: vacuumDropInHg,
		formula: 'drop = h / 1000, inHg with h in feet',
		source: 'US Army Ordnance course OD1001, lesson 3',
		example: { says: 'at 5000 ft', gives: () => vacuumDropInHg(5000), wanted: 5, within: 0.01 }
	}
];
