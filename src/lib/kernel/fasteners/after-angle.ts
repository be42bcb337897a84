import { cannot, computed, type Outcome } from '../outcome';
import { timesAsStiffNPerMm } from './joint-stiffness';
import type { Plan, PlannedStage } from './plan';
import type { Loads } from './proof-load';
import { boltStiffnessNPerMm } from './stiffness';
import { tightenByAngle } from './torque-angle';

/** Clamped iron or aluminium around a long bolt: common practice, no source; two to five are met. */
export const usualJointPerBolt = 3;

/** What the angles of a plan make of its snug loads, for the slipperiest and the driest bolt. */
export function afterAngle(
	plan: Plan,
	loads: Loads,
	snug: { leastN: number; mostN: number },
	angleDeg: number
): Outcome<Omit<PlannedStage, 'stage'>> {
	const { gripMm, pitchMm, jointPerBolt = usualJointPerBolt } = plan;
	if (!gripMm || !(gripMm > 0)) return cannot('an angle needs the length that is stretched');
	const bolt = boltStiffnessNPerMm([{ lengthMm: gripMm, areaMm2: loads.areaMm2 }]);
	if (!bolt.ok) return bolt;
	const joint = timesAsStiffNPerMm(jointPerBolt, bolt.value);
	if (!joint.ok) return joint;
	const turn = (snugN: number) =>
		tightenByAngle({
			snugN,
			angleDeg,
			pitchMm,
			boltNPerMm: bolt.value,
			jointNPerMm: joint.value,
			yieldN: loads.yieldN
		});
	const [soft, hard] = [turn(snug.leastN), turn(snug.mostN)];
	if (!soft.ok) return soft;
	if (!hard.ok) return hard;
	return computed({
		leastN: soft.value.preloadN,
		mostN: hard.value.preloadN,
		beyondProof: hard.value.preloadN > loads.proofN,
		beyondYield: hard.value.beyondYield,
		lastingShare: hard.value.lastingMm / gripMm
	});
}
