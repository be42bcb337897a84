import type { Formula } from '../../formula';
import { crushFromGap, crushOf, freeSpreadMm } from '../bearing-shell';
import { ringGapGrowthMm, ringGapInMm } from '../end-play';
import { clearanceFromShellsMm, fitOf, ofDiameter, usualOilClearanceMm } from '../fit';
import { onScaleMm, threadClearance } from '../gauging-thread';
import { oilClearance } from '../oil-clearance';
import { chooseShells } from '../shell-choice';
import { part } from './part';

const pin = [
	[40.0, 39.988],
	[39.993, 39.985]
];

/** What lies between two parts: clearances, gaps and the press of a shell. */
export const clearanceFormulas: readonly Formula[] = [
	{
		id: 'geometry/oil-clearance',
		works: oilClearance,
		formula: 'least = smallest bore − largest pin; most = largest bore − smallest pin',
		source: 'definition; NAVEDTRA 14075 (bore less journal)',
		example: {
			says: 'most, the same pin in a bore of 40.030 to 40.036 mm',
			gives: () => part(oilClearance([[40.03, 40.036]], pin), (one) => one.mostMm),
			wanted: 0.051,
			within: 1e-6
		}
	},
	{
		id: 'geometry/fit',
		works: fitOf,
		formula: 'least = smallest outer − largest inner; most = largest outer − smallest inner',
		source: 'definition of limits and fits, ISO 286-1',
		example: {
			says: 'a skirt of 73.960 to 73.975 in a bore of 74.000 to 74.020 mm, most',
			gives: () =>
				part(
					fitOf({ leastMm: 74, mostMm: 74.02 }, { leastMm: 73.96, mostMm: 73.975 }),
					(one) => one.mostMm
				),
			wanted: 0.06,
			within: 1e-6
		}
	},
	{
		id: 'geometry/clearance-from-shells',
		works: clearanceFromShellsMm,
		formula: 'C = H − 2 · w − D',
		source: 'definition; common practice, no source',
		example: {
			says: 'housing 43, wall 1.489, pin 39.99 mm',
			gives: () => clearanceFromShellsMm(43, 1.489, 39.99),
			wanted: 0.032,
			within: 1e-6
		}
	},
	{
		id: 'geometry/shell-choice',
		works: chooseShells,
		formula: 'C = H − 2 · w − D for each wall; the C nearest the middle of its limits',
		source: 'definition; the choice nearest the middle is common practice, no source',
		example: {
			says: 'walls of 1.486 and 1.489 mm in 43 mm on a pin of 39.99 mm, limits 0.020 to 0.048 mm: the clearance chosen',
			gives: () =>
				part(
					chooseShells(43, 39.99, [1.486, 1.489], { leastMm: 0.02, mostMm: 0.048 }),
					(one) => one.clearancesMm[one.chosen ?? -1] ?? NaN
				),
			wanted: 0.032,
			within: 1e-6
		}
	},
	{
		id: 'geometry/usual-oil-clearance',
		works: usualOilClearanceMm,
		formula: 'C = 0.001 · D',
		source: 'rule of thumb of the trade, never a limit',
		example: {
			says: 'a journal of 60 mm',
			gives: () => usualOilClearanceMm(60),
			wanted: 0.06,
			within: 1e-9
		}
	},
	{
		id: 'geometry/of-diameter',
		works: ofDiameter,
		formula: 'limit = k · D',
		source: 'limits printed per inch of diameter or span, US Army manuals',
		example: {
			says: '0.0004 an inch on 63.5 mm',
			gives: () => ofDiameter(0.0004, 63.5),
			wanted: 0.0254,
			within: 1e-9
		}
	},
	{
		id: 'geometry/crush',
		works: crushOf,
		formula: 'crush = s − π · H/2; interference in diameter = 2 · crush / π',
		source: 'geometry of a half circle; crush as US Army TM 5-3805-255-14 describes it',
		example: {
			says: 'a half shell of 67.574 mm in a housing of 43 mm',
			gives: () => part(crushOf(67.574, 43), (one) => one.crushMm),
			wanted: 0.03,
			within: 0.0005
		}
	},
	{
		id: 'geometry/crush-from-gap',
		works: crushFromGap,
		formula: 'crush of one half = g / 2; interference in diameter = g / π',
		source: 'method of the trade, common practice, no source; circumference',
		example: {
			says: 'a gap of 0.06 mm at the loosened split: interference',
			gives: () => part(crushFromGap(0.06), (one) => one.interferenceMm),
			wanted: 0.0191,
			within: 0.00005
		}
	},
	{
		id: 'geometry/free-spread',
		works: freeSpreadMm,
		formula: 'spread = w − H',
		source: 'definition; US Army TM 5-3805-255-14, bearing fitting',
		example: {
			says: '43.6 mm across the faces, housing 43 mm',
			gives: () => freeSpreadMm(43.6, 43),
			wanted: 0.6,
			within: 1e-6
		}
	},
	{
		id: 'geometry/gauging-thread',
		works: threadClearance,
		formula: 'least, most and mean of what the scale says; taper = most − least',
		source: "method of the thread's pack and of US Army manuals",
		example: {
			says: '0.038 and 0.051 mm read at the two ends, taper',
			gives: () => part(threadClearance([0.038, 0.051]), (one) => one.taperMm),
			wanted: 0.013,
			within: 1e-6
		}
	},
	{
		id: 'geometry/on-scale',
		works: onScaleMm,
		formula: 'straight line between the two marks that the width lies between',
		source: 'the scale of the pack; the straight line is common practice, no source',
		example: {
			says: 'half way between 0.05 and 0.03 mm',
			gives: () =>
				onScaleMm(
					[
						{ widthMm: 2, clearanceMm: 0.05 },
						{ widthMm: 3, clearanceMm: 0.03 }
					],
					2.5
				),
			wanted: 0.04,
			within: 1e-6
		}
	},
	{
		id: 'geometry/ring-gap-growth',
		works: ringGapGrowthMm,
		formula: 'Δg = π · ΔD',
		source: 'circumference; manuals round π to 3',
		example: {
			says: 'a bore 0.05 mm larger',
			gives: () => ringGapGrowthMm(0.05),
			wanted: 0.157,
			within: 0.0005
		}
	},
	{
		id: 'geometry/ring-gap-in',
		works: ringGapInMm,
		formula: 'g = g0 + π · ΔD',
		source: 'circumference; manuals round π to 3',
		example: {
			says: 'a gap of 0.30 mm in a bore 0.05 mm larger',
			gives: () => ringGapInMm(0.3, 0.05),
			wanted: 0.457,
			within: 0.0005
		}
	}
];
