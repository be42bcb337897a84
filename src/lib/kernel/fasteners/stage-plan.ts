import { cannot, computed, type Outcome } from '../outcome';
import { preloadN } from './preload';
import { boltLoads, type Loads, type PropertyClass } from './proof-load';
import { boltStiffnessNPerMm } from './stiffness';
import { tightenByAngle } from './torque-angle';

export type Stage = { torqueNm: number } | { angleDeg: number };
export type Plan = {
	diameterMm: number;
	pitchMm: number;
	propertyClass: PropertyClass;
	/** K that brackets the lubrication: least gives the hardest pull. */
	nutFactor: { least: number; most: number };
	/** Head to first loaded thread, mm; wanted where a stage is an angle. */
	gripMm?: number;
	/** Clamped parts against the bolt; stiffer parts reach yield sooner. */
	jointPerBolt?: number;
	stages: readonly Stage[];
};
export type PlannedStage = {
	stage: Stage;
	/** Preload after it, N: between the slipperiest and the driest the lubrication may be. */
	leastN: number;
	mostN: number;
	/** Whether the slipperiest bolt is past yield after it. */
	beyondYield: boolean;
	/** Lasting stretch of that bolt, as a share of its grip. */
	lastingShare: number;
};
export type StagePlan = { loads: Loads; stages: PlannedStage[] };

/** Clamped iron or aluminium around a long bolt: common practice, no source; two to five are met. */
const usualJointPerBolt = 3;

/**
 * What a tightening plan does to a bolt, stage by stage.
 *
 * Formula: torque stage F = T / (K · d); angle stage F = Fs + k · P · α/360° up to yield.
 * @param plan sizes in mm, torques in N·m, angles in degrees; see the type
 * @returns the bolt's loads in N and each stage's least and most preload; "cannot" where an angle
 *   comes first, a torque falls, or an angle has no grip length to work on
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
	return computed({ loads: loads.value, stages });
}

function afterAngle(
	plan: Plan,
	loads: Loads,
	snug: { leastN: number; mostN: number },
	angleDeg: number
): Outcome<Omit<PlannedStage, 'stage'>> {
	const { gripMm, pitchMm, jointPerBolt = usualJointPerBolt } = plan;
	if (!gripMm || !(gripMm > 0)) return cannot('an angle needs the length that is stretched');
	const bolt = boltStiffnessNPerMm([{ lengthMm: gripMm, areaMm2: loads.areaMm2 }]);
	if (!bolt.ok) return bolt;
	const turn = (snugN: number) =>
		tightenByAngle({
			snugN,
			angleDeg,
			pitchMm,
			boltNPerMm: bolt.value,
			jointNPerMm: bolt.value * jointPerBolt,
			yieldN: loads.yieldN
		});
	const [soft, hard] = [turn(snug.leastN), turn(snug.mostN)];
	if (!soft.ok) return soft;
	if (!hard.ok) return hard;
	return computed({
		leastN: soft.value.preloadN,
		mostN: hard.value.preloadN,
		beyondYield: hard.value.beyondYield,
		lastingShare: hard.value.lastingMm / gripMm
	});
}
