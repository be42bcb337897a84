import { computed } from '../../outcome';
import type { Formula } from '../../formula';
import { stagePlan } from '../stage-plan';
import {
	boltStiffnessNPerMm,
	inSeriesNPerMm,
	sleeveStiffnessNPerMm,
	stretchMm
} from '../stiffness';
import { angleForPreloadDeg, tightenByAngle } from '../torque-angle';

const shank = [{ lengthMm: 80, areaMm2: 58 }];
const joint = {
	snugN: 15_000,
	pitchMm: 1.25,
	boltNPerMm: 130_000,
	jointNPerMm: 390_000,
	yieldN: 57_500
};

/** Bolts that are turned on after a snug torque. */
export const angleFormulas: readonly Formula[] = [
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
	},
	{
		id: 'fasteners/torque-angle',
		works: tightenByAngle,
		formula:
			'F = Fs + k · P · α/360°, k = kb · kj / (kb + kj); beyond Fy, F = Fy + h · k · (s − sy)',
		source: 'VDI 2230 part 1, angle controlled tightening; bilinear model of the bolt',
		example: {
			says: '15 kN snug, then 90° on a pitch of 1.25 mm, N',
			gives: () => {
				const found = tightenByAngle({ ...joint, angleDeg: 90 });
				return found.ok ? computed(found.value.preloadN) : found;
			},
			wanted: 45_469,
			within: 0.5
		}
	},
	{
		id: 'fasteners/angle-for-preload',
		works: angleForPreloadDeg,
		formula: 'α = 360° · (F − Fs) · (1/kb + 1/kj) / P',
		source: 'VDI 2230 part 1, angle controlled tightening',
		example: {
			says: '45 469 N on the same joint, degrees',
			gives: () => angleForPreloadDeg(45_468.75, joint),
			wanted: 90,
			within: 0.01
		}
	},
	{
		id: 'fasteners/stage-plan',
		works: stagePlan,
		formula: 'torque stage F = T / (K · d); angle stage F = Fs + k · P · α/360° up to yield',
		source: 'T = K·D·F (FAA and NASA practice); VDI 2230 part 1, angle controlled tightening',
		example: {
			says: '25 then 50 N·m on M10 × 1.25, K from 0.15, hardest pull in N',
			gives: () => {
				const plan = stagePlan({
					diameterMm: 10,
					pitchMm: 1.25,
					propertyClass: '10.9',
					nutFactor: { least: 0.15, most: 0.2 },
					stages: [{ torqueNm: 25 }, { torqueNm: 50 }]
				});
				return plan.ok ? computed(plan.value.stages.at(-1)?.mostN ?? 0) : plan;
			},
			wanted: 33_333,
			within: 0.5
		}
	}
];
