import type { Formula } from '../../formula';
import { outOfRoundMm, taperMm } from '../diameter-grid';
import { deckHeight, endFloatMm } from '../end-play';
import { shapeOf } from '../grid-shape';
import { nextSize } from '../next-size';
import { wearMm } from '../wear';
import { part } from './part';

const twoPlanes =
	'method as in US Army TM 5-3805-262-34, p. 4-24 (second reading 90° from the first)';
const pin = [
	[40.0, 39.988],
	[39.993, 39.985]
];

/** Bores and journals by themselves, and where shafts and pistons stand. */
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
