import type { Formula } from '../../formula';
import { allowedOverMm } from '../flatness';
import { minimumZone } from '../minimum-zone';
import { outOfLinePer100Mm, rodLengthMm } from '../rod';
import { aroundTheTurn, eccentricityMm, runoutMm } from '../runout';
import { largestGapMm } from '../straight-edge';
import { straightness } from '../straightness';
import { ofWeightedReadingsMm } from '../weighted-readings';

/** Flat faces, rods and what turns. */
export const faceFormulas: readonly Formula[] = [
	{
		id: 'geometry/flatness',
		works: minimumZone,
		formula:
			'the least w for which a·x + b·y + c ≤ z ≤ a·x + b·y + c + w holds at every reading, for some a, b, c',
		source: 'ISO 12781-1:2011, minimum zone reference planes; duality of linear programming',
		example: {
			says: 'a twisted square: 0.02 mm high at two opposite corners',
			gives: () => {
				const found = minimumZone([
					{ xMm: 0, yMm: 0, zMm: 0 },
					{ xMm: 100, yMm: 0, zMm: 0.02 },
					{ xMm: 0, yMm: 100, zMm: 0.02 },
					{ xMm: 100, yMm: 100, zMm: 0 }
				]);
				return found.ok ? { ok: true, value: found.value.widthMm } : found;
			},
			wanted: 0.02,
			within: 1e-6
		}
	},
	{
		id: 'geometry/straightness',
		works: straightness,
		formula: 'largest |z2 − (z1 + (z3 − z1) · (x2 − x1) / (x3 − x1))| with x3 − x1 ≤ the stretch',
		source: 'ISO 12780-1:2011, minimum zone reference lines',
		example: {
			says: 'a gap of 0.04 mm under the middle of a straight edge',
			gives: () => {
				const found = straightness({ atMm: [0, 50, 100], heightMm: [0, -0.04, 0] });
				return found.ok ? { ok: true, value: found.value.widthMm } : found;
			},
			wanted: 0.04,
			within: 1e-6
		}
	},
	{
		id: 'geometry/largest-gap',
		works: largestGapMm,
		formula: 'largest gap = the thickest feeler that enters anywhere under the edge',
		source: 'definition; common practice',
		example: {
			says: 'gaps of 0, 0.04 and 0.02 mm',
			gives: () => largestGapMm([[0, 0.04, 0.02]]),
			wanted: 0.04,
			within: 1e-9
		}
	},
	{
		id: 'geometry/of-weighted-readings',
		works: ofWeightedReadingsMm,
		formula: 'U = U1 · √(Σ weight²)',
		source: 'JCGM 100:2008, 5.1.2, readings of one uncertainty that do not depend on each other',
		example: {
			says: 'four readings of weight one half, each ± 0.004 mm',
			gives: () => ofWeightedReadingsMm([0.5, 0.5, -0.5, -0.5], 0.004),
			wanted: 0.004,
			within: 1e-9
		}
	},
	{
		id: 'geometry/allowed-over',
		works: allowedOverMm,
		formula: 'allowed = (limit per 100 mm) · L / 100',
		source: 'proportion; US Army manuals state such limits by the inch of span',
		example: {
			says: '0.075 mm in 100 mm, over 304.8 mm',
			gives: () => allowedOverMm(0.075, 304.8),
			wanted: 0.2286,
			within: 1e-9
		}
	},
	{
		id: 'geometry/rod-out-of-line',
		works: outOfLinePer100Mm,
		formula: '((far − near) / S) · 100 of the small end, less the same of the big end',
		source: 'method as in US Army TM 9-2815-226-34-1, rod check steps 5-9; proportion',
		example: {
			says: '0.03 mm over 120 mm of mandrel',
			gives: () => outOfLinePer100Mm({ nearMm: 0, farMm: 0.03, apartMm: 120 }),
			wanted: 0.025,
			within: 1e-6
		}
	},
	{
		id: 'geometry/rod-length',
		works: rodLengthMm,
		formula: 'L = H − (D + d) / 2',
		source: 'definition',
		example: {
			says: '170.5 mm over mandrels of 40 and 18 mm',
			gives: () => rodLengthMm(170.5, 40, 18),
			wanted: 141.5,
			within: 1e-6
		}
	},
	{
		id: 'geometry/runout',
		works: runoutMm,
		formula: 'TIR = largest reading − smallest reading',
		source: 'definition; ISO 1101, circular run-out',
		example: {
			says: '0, 0.003, −0.002 and 0.003 around the turn',
			gives: () => runoutMm([0, 0.003, -0.002, 0.003]),
			wanted: 0.005,
			within: 1e-9
		}
	},
	{
		id: 'geometry/eccentricity',
		works: eccentricityMm,
		formula: 'e = TIR / 2',
		source: 'definition: the dial goes from +e to −e in half a turn',
		example: {
			says: '0.06 mm of runout',
			gives: () => eccentricityMm(0.06),
			wanted: 0.03,
			within: 1e-9
		}
	},
	{
		id: 'geometry/around-the-turn',
		works: aroundTheTurn,
		formula:
			'm + a · cos θ + b · sin θ by least squares; e = √(a² + b²); out-of-round = largest − smallest rest',
		source: 'ISO 12181-1:2011, least squares reference circle, for e small beside the radius',
		example: {
			says: '0.02, 0, −0.02 and 0 mm at the four quarters: eccentricity',
			gives: () => {
				const read = [0.02, 0, -0.02, 0];
				const found = aroundTheTurn(read.map((readMm, at) => ({ angleDeg: at * 90, readMm })));
				return found.ok ? { ok: true, value: found.value.eccentricityMm } : found;
			},
			wanted: 0.02,
			within: 1e-6
		}
	}
];
