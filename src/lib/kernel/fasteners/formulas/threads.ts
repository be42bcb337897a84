import { computed } from '../../outcome';
import type { Formula } from '../../formula';
import { boltLoads, gradeLoads, proofLoadN } from '../proof-load';
import { stressAreaIn2, stressAreaMm2 } from '../stress-area';
import { threadOf } from '../thread';
import { travelMm } from '../turn';

/** Threads and what they bear. */
export const threadFormulas: readonly Formula[] = [
	{
		id: 'fasteners/thread',
		works: threadOf,
		formula:
			'd2 = d − 0.649519 P; D1 = d − 1.082532 P; d3 = d − 1.226869 P; φ = atan(P / (π · d2))',
		source: 'ISO 724:1993; d3 as ISO 898-1:2013, 9.1.6.1',
		example: {
			says: 'pitch diameter of M10 × 1.5, mm',
			gives: () => {
				const thread = threadOf(10, 1.5);
				return thread.ok ? computed(thread.value.pitchDiameterMm) : thread;
			},
			wanted: 9.026,
			within: 0.0005
		}
	},
	{
		id: 'fasteners/stress-area',
		works: stressAreaMm2,
		formula: 'As = π/4 · ((d2 + d3)/2)², d2 = d − 0.649519 P, d3 = d − 1.226869 P',
		source: 'ISO 898-1:2013, 9.1.6.1, with diameters of ISO 724',
		example: {
			says: 'M10 × 1.5, mm²',
			gives: () => stressAreaMm2(10, 1.5),
			wanted: 58.0,
			within: 0.05
		}
	},
	{
		id: 'fasteners/stress-area-unified',
		works: stressAreaIn2,
		formula: 'As = 0.7854 · (d − 0.9743/n)²',
		source: 'ASME B1.1, tensile stress area',
		example: {
			says: '1/2-13, in²',
			gives: () => stressAreaIn2(0.5, 13),
			wanted: 0.1419,
			within: 0.00005
		}
	},
	{
		id: 'fasteners/proof-load',
		works: proofLoadN,
		formula: 'Fp = As · Sp',
		source: 'ISO 898-1:2013, tables 3, 5 and 7',
		example: {
			says: 'M10 × 1.5, class 10.9, N',
			gives: () => proofLoadN(10, 1.5, '10.9'),
			wanted: 48_100,
			within: 50
		}
	},
	{
		id: 'fasteners/bolt-loads',
		works: boltLoads,
		formula: 'F = As · S, S the proof, yield or tensile stress of the class',
		source: 'ISO 898-1:2013, tables 3 to 7',
		example: {
			says: 'least tensile load of M10 × 1.5, class 10.9, N',
			gives: () => {
				const loads = boltLoads(10, 1.5, '10.9');
				return loads.ok ? computed(loads.value.tensileN) : loads;
			},
			wanted: 60_300,
			within: 50
		}
	},
	{
		id: 'fasteners/grade-loads',
		works: gradeLoads,
		formula: 'F = As · S, S the proof, yield or tensile stress of the grade',
		source: 'SAE J429, mechanical requirements',
		example: {
			says: 'proof load of 1/2-13, grade 5, N (12 062 lbf)',
			gives: () => {
				const loads = gradeLoads(0.5, 13, '5');
				return loads.ok ? computed(loads.value.proofN) : loads;
			},
			wanted: 53_655,
			within: 5
		}
	},
	{
		id: 'fasteners/travel',
		works: travelMm,
		formula: 's = P · α / 360°',
		source: 'definition of pitch, ISO 5408',
		example: {
			says: '90° on a pitch of 1.25 mm',
			gives: () => travelMm(90, 1.25),
			wanted: 0.3125,
			within: 0.00005
		}
	}
];
