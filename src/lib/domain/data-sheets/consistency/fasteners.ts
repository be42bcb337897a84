import { patternFaults } from '$lib/kernel/fasteners/bolt-pattern';
import { stagePlan } from '$lib/kernel/fasteners/stage-plan';
import { nutFactorOf } from '../nut-factors';
import type { Fastener } from '../schema';
import { refused, warned, type Check, type Finding } from './finding';

/** Lasting stretch beyond which a bolt is drawn too far, as a share of its grip. Common practice, no source. */
const drawnTooFar = 0.01;
/** What a bolt that is fitted again may be loaded to, as a share of its proof load. */
const reusedShare = 0.9;

/** Stages against the bolt's strength: what its preload comes to between the slipperiest and the driest it may be. */
export const stagesSuitTheBolt: Check = ({ fasteners }) => fasteners.flatMap(stagesOf);

function stagesOf(bolt: Fastener): Finding[] {
	const { key, thread, propertyClass, gripMm, stages, yieldTightened, reuse } = bolt;
	const nutFactor = nutFactorOf(bolt);
	const turns = stages.some((one) => 'angleDeg' in one);
	if (turns && !gripMm)
		return [
			warned(
				key,
				'turns by an angle, but its stretched length is not given: its load cannot be told'
			)
		];
	const plan = stagePlan({ ...thread, propertyClass, nutFactor, gripMm, stages });
	if (!plan.ok) return [refused(key, plan.because)];
	const { loads } = plan.value;
	const last = plan.value.stages.at(-1);
	if (!last) return [];
	const kn = (newtons: number) => `${(newtons / 1000).toFixed(1)} kN`;
	const k = `K ${nutFactor.least} to ${nutFactor.most}`;
	if (!yieldTightened) {
		if (last.mostN > loads.proofN)
			return [
				refused(
					key,
					`its last stage pulls up to ${kn(last.mostN)} (${k}), past its proof load of ${kn(loads.proofN)}: mark it as yield-tightened, or mend a stage`
				)
			];
		return last.mostN > reusedShare * loads.proofN && !/new each time/i.test(reuse)
			? [
					warned(
						key,
						`is pulled to ${kn(last.mostN)} of ${kn(loads.proofN)} proof load (${k}) and used again`
					)
				]
			: [];
	}
	const found: Finding[] = [];
	if (!turns)
		found.push(refused(key, 'is yield-tightened by torque alone: an angle tells when it yields'));
	else if (last.mostN < loads.yieldN * 0.999)
		found.push(
			refused(
				key,
				`reaches ${kn(last.mostN)} of ${kn(loads.yieldN)} at yield (${k}): it is not yield-tightened`
			)
		);
	if (last.lastingShare > drawnTooFar)
		found.push(
			refused(
				key,
				`is drawn ${(last.lastingShare * 100).toFixed(1)} % of its length past yield: too far for one use`
			)
		);
	if (!/new each time/i.test(reuse))
		found.push(refused(key, `is drawn past yield, yet “${reuse}” is said of fitting it again`));
	return found;
}

/** Patterns as drawings: places, names, printed orders. */
export const patternsAreWhole: Check = ({ patterns, fasteners }) =>
	patterns.flatMap((one) => {
		const found: Finding[] = patternFaults(one).map((fault) => refused(one.key, fault));
		const count = fasteners.find(({ key }) => key === one.fastener)?.count;
		if (count !== undefined && count < one.bolts.length)
			found.push(
				warned(
					one.key,
					`draws ${one.bolts.length} bolts, and the sheet counts ${count} of ${one.fastener}`
				)
			);
		return found;
	});
