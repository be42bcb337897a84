import type { Stage } from './plan';

/**
 * What cannot be right about the stages of a plan, whatever the bolt.
 *
 * @param stages in their order @param slackenAfter the stage after which all bolts are slackened
 * @returns sentences; nothing where the plan can be worked
 * @example stageFaults([{ angleDeg: 90 }]) // ['stage 1 is an angle, and an angle is counted from a torque']
 */
export function stageFaults(stages: readonly Stage[], slackenAfter?: number): string[] {
	const faults: string[] = [];
	let torque = 0;
	let turned = false;
	for (const [at, stage] of stages.entries()) {
		const name = `stage ${at + 1}`;
		if ('angleDeg' in stage) {
			if (!(stage.angleDeg > 0)) faults.push(`${name} turns by nothing`);
			if (torque === 0) faults.push(`${name} is an angle, and an angle is counted from a torque`);
			turned = true;
		} else {
			if (!(stage.torqueNm > 0)) faults.push(`${name} is no torque`);
			if (turned) faults.push(`${name} is a torque after an angle: the angle is turned last`);
			else if (stage.torqueNm < torque)
				faults.push(`${name} is less than the one before, and nothing is slackened between`);
			torque = stage.torqueNm;
		}
		if (at + 1 === slackenAfter) [torque, turned] = [0, false];
	}
	return faults;
}
