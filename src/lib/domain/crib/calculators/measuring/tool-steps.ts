import { sharedMm, type InHand } from '$lib/kernel/measurement/in-hand';
import { repeatsNeeded } from '$lib/kernel/measurement/repeats';
import { usualRatio, type Asked, type ToolVerdict } from '$lib/kernel/measurement/tool';
import type { ToolChoice } from '$lib/kernel/measurement/tool-choice';
import { coverageFactor } from '$lib/kernel/measurement/uncertainty';
import type { Step } from '../../../working';
import { printed } from './printed';

export const verdictWords: Record<ToolVerdict, string> = {
	easily: 'judges easily',
	yes: 'can judge',
	'in-part': 'decides only well away from the limits',
	no: 'cannot call anything within'
};

type Judged = ToolChoice['judged'];
type NamedTool = InHand & { name: string };

/** For each tool its uncertainty and how often twice of it goes into the limits. */
export function toolSteps(
	{ least, most, room }: Asked,
	tools: readonly NamedTool[],
	judged: Judged,
	readings: number,
	neededMm: number,
	decimals: number
): Step[] {
	const both = least !== undefined && most !== undefined;
	const width = both ? `(${printed(most, decimals)} − ${printed(least, decimals)})` : room;
	const needed: Step = {
		words: 'What is needed to judge',
		rule: both ? `U = (most − least) / (2 · ${usualRatio})` : `U = room / ${usualRatio}`,
		formula: both ? `${width} / (2 · ${usualRatio})` : `${width} / ${usualRatio}`,
		value: neededMm,
		unit: 'mm',
		decimals
	};
	const steps = judged.flatMap(({ name, expanded, judgement }, at): Step[] => {
		const tool = tools[at];
		if (!tool) return [];
		const { scatterMm, leastCountMm, calibrationMm } = tool;
		const U = printed(expanded, decimals + 1);
		return [
			{
				words: `${name}: uncertainty of ${readings === 1 ? 'one reading' : `the mean of ${readings} readings`}`,
				rule: 'U = 2 · √(s² / n + δ² / 12 + (U_cal / 2)²)',
				formula: `2 · √(${scatterMm}² / ${readings} + ${leastCountMm}² / 12 + (${calibrationMm} / 2)²)`,
				value: expanded,
				unit: 'mm',
				decimals: decimals + 1
			},
			{
				words: `${name}: ratio`,
				rule: both ? '(most − least) / (2 · U)' : 'room / U',
				formula: both ? `${width} / (2 · ${U})` : `${width} / ${U}`,
				value: judgement.ratio,
				unit: '',
				decimals: 2
			}
		];
	});
	return [needed, ...steps];
}

/** For each tool that falls short whether measuring again would mend that. */
export function repeatNotes(
	tools: readonly NamedTool[],
	judged: Judged,
	readings: number,
	neededMm: number
): string[] {
	return judged.flatMap(({ name, expanded }, at) => {
		const tool = tools[at];
		if (!tool || expanded <= neededMm * (1 + 1e-9)) return [];
		if (tool.scatterMm === 0)
			return [`${name}: with its scatter not known, nobody can say whether repeats help.`];
		const n = repeatsNeeded(tool.scatterMm, sharedMm(tool), neededMm / coverageFactor);
		if (!n.ok)
			return [
				`${name}: repeats do not help. Its least count and calibration alone are too coarse.`
			];
		return n.value > readings ? [`${name}: the mean of ${n.value} readings would do.`] : [];
	});
}
