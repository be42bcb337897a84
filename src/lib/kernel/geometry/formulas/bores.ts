import type { Formula } from '../../formula';
import { computed, type Outcome } from '../../outcome';
import { crushOf, freeSpreadMm } from '../bearing-shell';
import { outOfRoundMm, taperMm } from '../diameter-grid';
import { deckHeight, endFloatMm, ringGapGrowthMm } from '../end-play';
import { clearanceFromShellsMm, fitOf, ofDiameter, usualOilClearanceMm } from '../fit';
import { onScaleMm, threadClearance } from '../gauging-thread';
import { shapeOf } from '../grid-shape';
import { nextSize } from '../next-size';
import { oilClearance } from '../oil-clearance';
import { wearMm } from '../wear';

const twoPlanes =
	'method as in US Army TM 5-3805-262-34, p. 4-24 (second reading 90° from the first)';
const pin = [
	[40.0, 39.988],
	[39.993, 39.985]
];
/** One figure of a sum that gives several. */
const part = <T>(found: Outcome<T>, of: (value: T) => number): Outcome<number> =>
	found.ok ? computed(of(found.value)) : found;

/** Bores, journals and what lies between them. */
export const boreFormulas: readonly Formula[] = [
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
		example: { says: 'the same pin', gives: () => taperMm(pin), wanted: 0.007, within: 1e-6 }
	},
	{
		id: 'geometry/shape',
		works: shapeOf,
		formula:
			'taper = first − last mean; ends − middle = (first + last)/2 − mean of the depths between',
		source: 'names of form as ISO 12180-1; means of the depths are common practice',
		example: {
			says: 'ends of 74.03 and a middle of 74.01 mm',
			gives: () => part(shapeOf([[74.03], [74.01], [74.03]], 0.005), (one) => one.endsLessMiddleMm),
			wanted: 0.02,
			within: 1e-6
		}
	},
	{
		id: 'geometry/next-size',
		works: nextSize,
		formula: 'bore: nominal + step ≥ largest + stock; journal: nominal − step ≤ smallest − stock',
		source: 'definition; undersize as in US Army TM 5-3805-262-34',
		example: {
			says: 'a bore of 74.13 on 74, steps 0.25 and 0.5, stock 0.05 mm: the step',
			gives: () => part(nextSize('bore', 74.13, 74, [0.25, 0.5], 0.05), (one) => one.stepMm),
			wanted: 0.25,
			within: 1e-9
		}
	},
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
		id: 'geometry/end-float',
		works: endFloatMm,
		formula: 'float = reading pushed away − reading pushed to, without its sign',
		source: "method as in US Army manuals (dial on the shaft's end)",
		example: {
			says: '0.02 and 0.17 mm',
			gives: () => endFloatMm(0.02, 0.17),
			wanted: 0.15,
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
		id: 'geometry/deck-height',
		works: deckHeight,
		formula: 'height = mean of the readings along the pin axis; rock = largest − smallest',
		source: 'common practice, no source',
		example: {
			says: '0.42 and 0.46 mm',
			gives: () => part(deckHeight([0.42, 0.46]), (one) => one.heightMm),
			wanted: 0.44,
			within: 1e-6
		}
	}
];
