import type { Formula } from '../formula';
import { effectiveLever, torqueAtFastener, wrenchSetting } from './extension';
import { preloadN, torqueForPreloadNm } from './preload';
import { proofLoadN } from './proof-load';
import { stressAreaIn2, stressAreaMm2 } from './stress-area';
import { travelMm } from './turn';

const leverRule = 'US Army TM 1-1500-204-23-9, chapter 8, figure 8-16; FAA AC 43.13-1B, 7-40';
const lever = { lengthL: 400, extensionE: 100, angleDeg: 60 };

export const fastenerFormulas: readonly Formula[] = [
	{
		id: 'fasteners/effective-lever',
		works: effectiveLever,
		formula: 'Leff = L + E · cos φ',
		source: leverRule,
		example: {
			says: 'L 400 mm, E 100 mm, 60°',
			gives: () => effectiveLever(lever),
			wanted: 450,
			within: 0.01
		}
	},
	{
		id: 'fasteners/wrench-setting',
		works: wrenchSetting,
		formula: 'Tw = Ta · L / (L + E · cos φ)',
		source: leverRule,
		example: {
			says: '80 N·m wanted, L 400 mm, E 100 mm, 60°',
			gives: () => wrenchSetting({ torque: 80, ...lever }),
			wanted: 71.11,
			within: 0.005
		}
	},
	{
		id: 'fasteners/torque-at-fastener',
		works: torqueAtFastener,
		formula: 'Ta = Tw · (L + E · cos φ) / L',
		source: leverRule,
		example: {
			says: 'set to 50 N·m, L 400 mm, E 60 mm straight on',
			gives: () => torqueAtFastener({ torque: 50, lengthL: 400, extensionE: 60, angleDeg: 0 }),
			wanted: 57.5,
			within: 0.005
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
