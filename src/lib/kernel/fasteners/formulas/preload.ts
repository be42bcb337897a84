import { computed } from '../../outcome';
import type { Formula } from '../../formula';
import { assemblyPreloadN, strengthWhileTurned } from '../assembly-preload';
import { bearingMeanMm, preloadByFrictionN, torqueByFriction } from '../friction';
import { middleNutFactor } from '../nut-factor';
import { clampLoadN, loadShare, preloadN, torqueForPreloadNm } from '../preload';
import { screwTorqueNm } from '../screw-torque';

const vdi = 'VDI 2230 part 1, tightening torque';
const joint = {
	diameterMm: 10,
	pitchMm: 1.25,
	threadFriction: 0.12,
	headFriction: 0.12,
	bearingMeanMm: 12.8
};

/** Torque and the load that it gives. */
export const preloadFormulas: readonly Formula[] = [
	{
		id: 'fasteners/preload',
		works: preloadN,
		formula: 'F = T / (K · d)',
		source: 'FAA and NASA practice (T = K·D·F)',
		example: {
			says: '50 N·m, K 0.18, 10 mm, N',
			gives: () => preloadN(50, 0.18, 10),
			wanted: 27_778,
			within: 0.5
		}
	},
	{
		id: 'fasteners/torque-for-preload',
		works: torqueForPreloadNm,
		formula: 'T = K · d · F',
		source: 'FAA and NASA practice (T = K·D·F)',
		example: {
			says: '30 kN, K 0.2, 10 mm, N·m',
			gives: () => torqueForPreloadNm(30_000, 0.2, 10),
			wanted: 60,
			within: 0.005
		}
	},
	{
		id: 'fasteners/middle-nut-factor',
		works: middleNutFactor,
		formula: 'K = (least + most) / 2',
		source: 'definition of the middle of a range',
		example: {
			says: 'oiled, 0.15 to 0.20',
			gives: () => middleNutFactor({ least: 0.15, most: 0.2 }),
			wanted: 0.175,
			within: 1e-9
		}
	},
	{
		id: 'fasteners/clamp-load',
		works: clampLoadN,
		formula: 'F = s · Fp',
		source:
			'textbook rule: 75 % of proof load where a joint is taken apart again, 90 % where it stays',
		example: {
			says: '75 % of 48.14 kN, N',
			gives: () => clampLoadN(0.75, 48_140),
			wanted: 36_105,
			within: 0.5
		}
	},
	{
		id: 'fasteners/load-share',
		works: loadShare,
		formula: 's = F / Fp',
		source: 'the same rule turned round',
		example: {
			says: '36 105 N on a proof load of 48 140 N',
			gives: () => loadShare(36_105, 48_140),
			wanted: 0.75,
			within: 1e-9
		}
	},
	{
		id: 'fasteners/bearing-mean',
		works: bearingMeanMm,
		formula: 'Dkm = (dw + dh) / 2',
		source: 'VDI 2230 part 1, mean bearing diameter',
		example: {
			says: 'a face of 14.6 mm on a hole of 11 mm',
			gives: () => bearingMeanMm(14.6, 11),
			wanted: 12.8,
			within: 1e-9
		}
	},
	{
		id: 'fasteners/torque-by-friction',
		works: torqueByFriction,
		formula: 'M = F · (0.16 P + 0.58 d2 µG + Dkm/2 · µK)',
		source: vdi,
		example: {
			says: '46.4 kN on M10 × 1.25, friction 0.12 and 0.12, mean bearing diameter 12.8 mm, N·m',
			gives: () => {
				const found = torqueByFriction(46_400, joint);
				return found.ok ? computed(found.value.torqueNm) : found;
			},
			wanted: 75,
			within: 0.5
		}
	},
	{
		id: 'fasteners/preload-by-friction',
		works: preloadByFrictionN,
		formula: 'F = M / (0.16 P + 0.58 d2 µG + Dkm/2 · µK)',
		source: vdi,
		example: {
			says: '75 N·m on the same joint, N',
			gives: () => preloadByFrictionN(75, joint),
			wanted: 46_400,
			within: 300
		}
	},
	{
		id: 'fasteners/screw-torque',
		works: screwTorqueNm,
		formula:
			'M = F · d2/2 · (l + µG/cos 30°) / (1 − µG · l/cos 30°) + F · µK · Dkm/2, l = P / (π · d2)',
		source: 'power-screw formula of the textbooks',
		example: {
			says: '46.4 kN on the same joint, N·m',
			gives: () => screwTorqueNm(46_400, joint),
			wanted: 74.7,
			within: 0.3
		}
	},
	{
		id: 'fasteners/strength-while-turned',
		works: strengthWhileTurned,
		formula: 'q = 1 / √(1 + 3 · (1.5 · d2/d0 · (P/(π · d2) + 1.155 µG))²)',
		source: 'VDI 2230 part 1, reduced stress at assembly',
		example: {
			says: 'M10 × 1.25, friction 0.12',
			gives: () => strengthWhileTurned(10, 1.25, 0.12),
			wanted: 0.8973,
			within: 0.00005
		}
	},
	{
		id: 'fasteners/assembly-preload',
		works: assemblyPreloadN,
		formula: 'F = ν · Re · As / √(1 + 3 · (1.5 · d2/d0 · (P/(π · d2) + 1.155 µG))²)',
		source: 'VDI 2230 part 1, permissible assembly preload',
		example: {
			says: 'M10 × 1.25, yield 940 N/mm², friction 0.12, N',
			gives: () => assemblyPreloadN(10, 1.25, 940, 0.12),
			wanted: 46_400,
			within: 60
		}
	}
];
