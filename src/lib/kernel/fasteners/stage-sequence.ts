import { computedNumber } from '../computed-number';
import { cannot, computed, type Outcome } from '../outcome';
import type { Stage } from './plan';
import { stagePasses } from './stage-passes';

export type SequenceStep = { stage: number; bolt: string };

/**
 * A plan as the steps of the hand: every bolt through one stage before any begins the next.
 *
 * @param order bolt ids as they are tightened @param stages how many stages
 * @returns stages counted from 1
 * Source: US Army TM 10-3930-669-20, para E-4 (references OR01 and OR02).
 * @example stageSequence(['a', 'b'], 2) // a 1, b 1, a 2, b 2
 */
export function stageSequence(order: readonly string[], stages: number): Outcome<SequenceStep[]> {
	const passes = stagePasses(order, stages);
	if (!passes.ok) return passes;
	return computed(
		passes.value.flatMap(({ stage = 0, bolts }) => bolts.map((bolt) => ({ stage, bolt })))
	);
}

/**
 * Stages of a third, two thirds and the whole of a torque, where the maker prints one figure only.
 *
 * Formula: T/3, 2T/3, T, each to a whole newton metre.
 * @param torqueNm final torque T, N·m, at least 3
 * @returns N·m, rising
 * Source: common practice (references OR20 to OR22). What the maker prints wins.
 * @example thirdsNm(90) // [30, 60, 90]
 */
export function thirdsNm(torqueNm: number): Outcome<number[]> {
	if (!(torqueNm >= 3) || torqueNm > 1e5)
		return cannot('a torque to be taken in thirds is at least 3 N·m');
	return computed([Math.round(torqueNm / 3), Math.round((2 * torqueNm) / 3), torqueNm]);
}

/** The last torque of a plan's stages, N·m; none where all of them are angles. */
export function lastTorqueNm(stages: readonly Stage[]): number | undefined {
	return stages.flatMap((one) => ('torqueNm' in one ? [one.torqueNm] : [])).at(-1);
}

/** All the angle that a plan turns after its last torque, degrees. */
export function turnedDeg(stages: readonly Stage[]): number {
	return stages.reduce((sum, one) => sum + ('angleDeg' in one ? one.angleDeg : 0), 0);
}

/**
 * What is still to be turned of a plan's angles.
 *
 * Formula: left = Σ angle stages − turned.
 * @param stages of one plan, in their order @param turned since the last torque, degrees
 * @returns degrees; "cannot" where more was turned than the plan has
 * Source: by definition of the stages.
 * @example leftToTurnDeg([{ torqueNm: 30 }, { angleDeg: 90 }, { angleDeg: 90 }], 105) // 75
 */
export function leftToTurnDeg(stages: readonly Stage[], turned: number): Outcome<number> {
	if (!(turned >= 0)) return cannot('an angle is a number, zero or more');
	const all = turnedDeg(stages);
	if (turned > all) return cannot(`the plan turns ${all}° in all, and more was turned`);
	return computedNumber(all - turned);
}
