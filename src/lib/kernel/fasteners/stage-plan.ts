import { cannot, computed, type Outcome } from '../outcome';
import { afterAngle } from './after-angle';
import type { Plan, PlannedStage, StagePlan } from './plan';
import { preloadN } from './preload';
import { boltLoads } from './proof-load';

export type { Plan, PlannedStage, Stage, StagePlan } from './plan';

/**
 * What a tightening plan does to a bolt, stage by stage.
 *
 * Formula: torque stage F = T / (K · d); angle stage F = Fs + k · P · α/360° up to yield.
 * @param plan sizes in mm, torques in N·m, angles in degrees; see the type
 * @returns the bolt's loads in N and each stage's least and most preload; "cannot" where an angle
 *   comes first, a torque falls, an angle has no grip length to work on, or a bolt that is not
 *   yield-tightened is taken past its proof load
 * Source: T = K·D·F (FAA and NASA practice); VDI 2230 part 1, angle controlled tightening.
 * @example stagePlan({ diameterMm: 10, pitchMm: 1.25, propertyClass: '10.9',
 *   nutFactor: { least: 0.15, most: 0.2 }, stages: [{ torqueNm: 25 }, { torqueNm: 50 }] })
 *   // after the second stage 25 000 to 33 333 N
 */
export function stagePlan(plan: Plan): Outcome<StagePlan> {
	const loads = boltLoads(plan.diameterMm, plan.pitchMm, plan.propertyClass);
	if (!loads.ok) return loads;
	const { least, most } = plan.nutFactor;
	if (!(least > 0) || !(most >= least))
		return cannot('the nut factors are above zero, least first');
	if (plan.stages.length === 0) return cannot('a plan has at least one stage');
	const stages: PlannedStage[] = [];
	let torque = 0;
	let snug = { leastN: 0, mostN: 0 };
	let turnedDeg = 0;
	for (const [at, stage] of plan.stages.entries()) {
		if ('torqueNm' in stage) {
			if (turnedDeg > 0) return cannot(`stage ${at + 1} is a torque after an angle`);
			if (!(stage.torqueNm > torque))
				return cannot(`stage ${at + 1} is no more than the one before`);
			torque = stage.torqueNm;
			const hard = preloadN(torque, least, plan.diameterMm);
			const soft = preloadN(torque, most, plan.diameterMm);
			if (!hard.ok) return hard;
			if (!soft.ok) return soft;
			snug = { leastN: soft.value, mostN: hard.value };
			stages.push({
				stage,
				...snug,
				beyondProof: hard.value > loads.value.proofN,
				beyondYield: hard.value > loads.value.yieldN,
				lastingShare: 0
			});
			continue;
		}
		if (torque === 0) return cannot('an angle is counted from a snug torque: a torque comes first');
		turnedDeg += stage.angleDeg;
		const turned = afterAngle(plan, loads.value, snug, turnedDeg);
		if (!turned.ok) return turned;
		stages.push({ stage, ...turned.value });
	}
	const past = stages.findIndex((one) => one.beyondProof);
	if (plan.yieldTightened === false && past >= 0)
		return cannot(`stage ${past + 1} takes the bolt past its proof load`);
	return computed({ loads: loads.value, stages });
}
