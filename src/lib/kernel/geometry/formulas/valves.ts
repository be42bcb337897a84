import type { Formula } from '../../formula';
import { shimPlan } from '../shim-plan';
import {
	lashAtValveMm,
	nearestShimMm,
	screwTurnDeg,
	shimCount,
	shimForLashMm
} from '../valve-lash';

/** Lash and shims. */
export const valveFormulas: readonly Formula[] = [
	{
		id: 'geometry/shim-for-lash',
		works: shimForLashMm,
		formula: 'N = T + (A − V)',
		source: "the rule of makers' shop manuals for shims over or under a bucket tappet",
		example: {
			says: 'a shim of 2.95 mm, 0.35 mm measured, 0.20 mm wanted',
			gives: () => shimForLashMm(2.95, 0.35, 0.2),
			wanted: 3.1,
			within: 1e-6
		}
	},
	{
		id: 'geometry/nearest-shim',
		works: nearestShimMm,
		formula: 'from + step · round((wanted − from) / step)',
		source: 'rounding to the step; common practice, no source',
		example: {
			says: '2.733 mm in steps of 0.05 mm',
			gives: () => nearestShimMm(2.733, { fromMm: 2, toMm: 3, stepMm: 0.05 }),
			wanted: 2.75,
			within: 1e-6
		}
	},
	{
		id: 'geometry/shim-count',
		works: shimCount,
		formula: 'n = (to − from) / step + 1',
		source: "makers' shop manuals (2.00 to 2.98 mm by 0.02 mm: 50 sizes)",
		example: {
			says: '2.00 to 2.98 mm by 0.02 mm',
			gives: () => shimCount({ fromMm: 2, toMm: 2.98, stepMm: 0.02 }),
			wanted: 50,
			within: 1e-9
		}
	},
	{
		id: 'geometry/shim-plan',
		works: shimPlan,
		formula:
			'fewest bought, then least Σ |lash − middle|, every lash = A + T − N within its limits',
		source: 'the shop rule N = T + (A − V); H. W. Kuhn (1955), the assignment problem',
		example: {
			says: 'the size to buy for a shim of 2.50 mm and 0.30 mm measured, limits 0.18 to 0.22 mm',
			gives: () => {
				const found = shimPlan(
					[{ name: '1', shimMm: 2.5, lashMm: 0.3, leastMm: 0.18, mostMm: 0.22 }],
					[],
					{ fromMm: 2, toMm: 3, stepMm: 0.05 }
				);
				return found.ok ? (found.value.buy[0]?.sizeMm ?? 0) : found;
			},
			wanted: 2.6,
			within: 1e-6
		}
	},
	{
		id: 'geometry/screw-turn',
		works: screwTurnDeg,
		formula: 'α = 360° · d / P',
		source: 'definition of pitch, ISO 5408',
		example: {
			says: '0.05 mm on a pitch of 1 mm',
			gives: () => screwTurnDeg(0.05, 1),
			wanted: 18,
			within: 1e-9
		}
	},
	{
		id: 'geometry/lash-at-valve',
		works: lashAtValveMm,
		formula: 'valve = gap · ratio',
		source: 'law of the lever',
		example: {
			says: '0.20 mm at the push rod, ratio 1.5',
			gives: () => lashAtValveMm(0.2, 1.5),
			wanted: 0.3,
			within: 1e-9
		}
	}
];
