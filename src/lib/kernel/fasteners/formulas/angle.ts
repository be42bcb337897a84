import { computed } from '../../outcome';
import type { Formula } from '../../formula';
import { stagePlan } from '../stage-plan';
import { leftToTurnDeg } from '../stage-sequence';
import { angleForPreloadDeg, tightenByAngle } from '../torque-angle';

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
	},
	{
		id: 'fasteners/left-to-turn',
		works: leftToTurnDeg,
		formula: 'left = Σ angle stages − turned',
		source: 'by definition of the stages',
		example: {
			says: 'twice 90°, 105° turned, degrees',
			gives: () => leftToTurnDeg([{ torqueNm: 30 }, { angleDeg: 90 }, { angleDeg: 90 }], 105),
			wanted: 75,
			within: 1e-9
		}
	}
];
