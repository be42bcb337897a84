import type { Formula } from '../../formula';
import {
	coneStiffnessNPerMm,
	jointOfConesNPerMm,
	sleeveStiffnessNPerMm,
	timesAsStiffNPerMm
} from '../joint-stiffness';
import { boltStiffnessNPerMm, inSeriesNPerMm, preloadOfStretchN, stretchMm } from '../stiffness';
import { lastingStrain, yieldLoadN } from '../yield-load';

const shank = [{ lengthMm: 80, areaMm2: 58 }];
const cones = "Shigley's Mechanical Engineering Design, chapter 8, stiffness of members";

/** Bolts and what they clamp, as springs. */
export const stiffnessFormulas: readonly Formula[] = [
	{
		id: 'fasteners/stretch',
		works: stretchMm,
		formula: 'ΔL = F / E · Σ (Li / Ai)',
		source: "Hooke's law for bars in series",
		example: {
			says: '40 kN on 80 mm of 58 mm² steel, mm',
			gives: () => stretchMm(40_000, shank),
			wanted: 0.269,
			within: 0.0005
		}
	},
	{
		id: 'fasteners/bolt-stiffness',
		works: boltStiffnessNPerMm,
		formula: 'k = E / Σ (Li / Ai)',
		source: "Hooke's law for bars in series; VDI 2230 part 1, bolt resilience",
		example: {
			says: 'the same bolt, N/mm',
			gives: () => boltStiffnessNPerMm(shank),
			wanted: 148_600,
			within: 50
		}
	},
	{
		id: 'fasteners/preload-of-stretch',
		works: preloadOfStretchN,
		formula: 'F = ΔL · E / Σ (Li / Ai)',
		source: "Hooke's law for bars in series",
		example: {
			says: '0.269 mm on the same bolt, N',
			gives: () => preloadOfStretchN(0.269, shank),
			wanted: 39_980,
			within: 10
		}
	},
	{
		id: 'fasteners/sleeve-stiffness',
		works: sleeveStiffnessNPerMm,
		formula: 'k = E · π/4 · (D² − dh²) / L',
		source: "Hooke's law for a sleeve; VDI 2230 part 1, clamped parts",
		example: {
			says: 'aluminium, 20 mm wide, hole 11 mm, 80 mm long, N/mm',
			gives: () => sleeveStiffnessNPerMm(20, 11, 80, 70_000),
			wanted: 191_700,
			within: 100
		}
	},
	{
		id: 'fasteners/times-as-stiff',
		works: timesAsStiffNPerMm,
		formula: 'kj = n · kb',
		source: 'definition of a ratio of stiffnesses; two to five are met, common practice',
		example: {
			says: 'three times 132 kN/mm, N/mm',
			gives: () => timesAsStiffNPerMm(3, 132_000),
			wanted: 396_000,
			within: 0.5
		}
	},
	{
		id: 'fasteners/cone-stiffness',
		works: coneStiffnessNPerMm,
		formula: 'k = 0.5774 π · E · d / ln((1.155 t + D − d)(D + d) / ((1.155 t + D + d)(D − d)))',
		source: cones,
		example: {
			says: '20 mm of steel of 207 GPa under a face of 15 mm on a bolt of 10 mm, N/mm',
			gives: () => coneStiffnessNPerMm(15, 10, 20, 207_000),
			wanted: 3_503_000,
			within: 500
		}
	},
	{
		id: 'fasteners/joint-of-cones',
		works: jointOfConesNPerMm,
		formula: 'k = k(cone of L/2) / 2',
		source: cones,
		example: {
			says: '40 mm of the same between two such faces, N/mm',
			gives: () => jointOfConesNPerMm(15, 10, 40, 207_000),
			wanted: 1_751_500,
			within: 500
		}
	},
	{
		id: 'fasteners/yield-load',
		works: yieldLoadN,
		formula: 'Fy = q · Re · A',
		source: 'definition of yield strength, ISO 898-1; q as VDI 2230 part 1',
		example: {
			says: '61.2 mm² of class 10.9, N',
			gives: () => yieldLoadN(61.2, 940),
			wanted: 57_528,
			within: 0.5
		}
	},
	{
		id: 'fasteners/lasting-strain',
		works: lastingStrain,
		formula: 'ε = ΔL / L',
		source: 'definition of plastic strain',
		example: {
			says: '0.2 mm in 35 mm',
			gives: () => lastingStrain(0.2, 35),
			wanted: 0.0057,
			within: 0.00005
		}
	},
	{
		id: 'fasteners/in-series',
		works: inSeriesNPerMm,
		formula: 'k = a · b / (a + b)',
		source: 'springs in series',
		example: {
			says: '150 and 450 kN/mm, N/mm',
			gives: () => inSeriesNPerMm(150_000, 450_000),
			wanted: 112_500,
			within: 0.5
		}
	}
];
