import type { Formula } from '../../formula';
import { computed, type Outcome } from '../../outcome';
import { clearanceForCm3, compressionRatio, ratioOf } from '../compression-ratio';
import { discHeightMm, discVolumeCm3 } from '../disc-volume';
import { displacementCm3 } from '../displacement';
import { liquidLock } from '../liquid-lock';
import { skimmedChamberCm3 } from '../skimming';
import { solvePart } from '../solve-part';

const part = <T>(found: Outcome<T>, of: (value: T) => number): Outcome<number> =>
	found.ok ? computed(of(found.value)) : found;
const cylinder = { boreMm: 102.362, strokeMm: 88.392 };
const parts = {
	chamberCm3: 64,
	gasketBoreMm: 104.14,
	gasketMm: 1.0414,
	deckMm: 0.254,
	crownCm3: 5
};

export const volumeFormulas: readonly Formula[] = [
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
	},
	{
		id: 'cylinder/disc-volume',
		works: discVolumeCm3,
		formula: 'V = π/4 · D² · h',
		source: 'definition',
		example: {
			says: 'a gasket of 104.14 mm bore and 1.0414 mm, cm³',
			gives: () => discVolumeCm3(104.14, 1.0414),
			wanted: 8.87,
			within: 0.005
		}
	},
	{
		id: 'cylinder/disc-height',
		works: discHeightMm,
		formula: 'h = V / (π/4 · D²)',
		source: 'definition',
		example: {
			says: '8.87 cm³ over 104.14 mm, mm',
			gives: () => discHeightMm(8.87, 104.14),
			wanted: 1.0414,
			within: 0.0005
		}
	},
	{
		id: 'cylinder/ratio',
		works: ratioOf,
		formula: 'ε = (Vs + Vc) / Vc',
		source: 'definition',
		example: {
			says: '823.7 cm³ swept over 100 cm³',
			gives: () => ratioOf(823.7, 100),
			wanted: 9.237,
			within: 0.0005
		}
	},
	{
		id: 'cylinder/clearance-for',
		works: clearanceForCm3,
		formula: 'Vc = Vs / (ε − 1)',
		source: 'definition',
		example: {
			says: '997.46 cm³ at 16 : 1, cm³',
			gives: () => clearanceForCm3(997.46, 16),
			wanted: 66.5,
			within: 0.05
		}
	},
	{
		id: 'cylinder/compression-ratio',
		works: compressionRatio,
		formula: 'Vc = chamber + gasket + deck + crown + crevice; ε = (Vs + Vc) / Vc',
		source: 'definition',
		example: {
			says: 'bore 102.362, stroke 88.392 mm, chamber 64, dish 5 cm³, gasket 1.04, deck 0.254 mm',
			gives: () => part(compressionRatio(cylinder, parts), (one) => one.ratio),
			wanted: 10.1,
			within: 0.01
		}
	},
	{
		id: 'cylinder/solve-part',
		works: solvePart,
		formula: 'part = Vs / (ε − 1) − all the others; a height = volume / (π/4 · D²)',
		source: 'definition',
		example: {
			says: 'the chamber of the same cylinder for 10 : 1, cm³',
			gives: () => part(solvePart(cylinder, parts, 'chamberCm3', 10), (one) => one.value),
			wanted: 64.86,
			within: 0.05
		}
	},
	{
		id: 'cylinder/skimmed-chamber',
		works: skimmedChamberCm3,
		formula: 'V = V0 − A · c / 10, V in cm³, A in cm², c in mm',
		source: 'volume of a slice',
		example: {
			says: '52.6 cm³ with an opening of 50 cm², 0.2 mm taken off, cm³',
			gives: () => skimmedChamberCm3(52.6, 50, 0.2),
			wanted: 51.6,
			within: 1e-9
		}
	},
	{
		id: 'cylinder/liquid-lock',
		works: liquidLock,
		formula: 'x = (q − Vc) / (π/4 · B²)',
		source: 'volume of a cylinder',
		example: {
			says: '80 cm³ over a clearance of 52.63 cm³, bore 86 mm: below top dead centre, mm',
			gives: () => part(liquidLock(80, 52.63, 86), (one) => one.belowTdcMm),
			wanted: 4.71,
			within: 0.005
		}
	}
];
