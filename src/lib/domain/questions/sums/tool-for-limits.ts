import { z } from 'zod';
import { inHandMm } from '$lib/kernel/measurement/in-hand';
import { cannot, computed } from '$lib/kernel/outcome';
import { whichTool } from '../../crib/calculators/which-tool';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const toolForLimitsParameters = z.strictObject({
	/** A length with two limits for building. */
	of: sheetKeySchema,
	/** How coarse a tool may be; U of the one at hand; its ratio. */
	ask: z.enum(['needed', 'expanded', 'ratio'])
});

/**
 * Whether a tool can judge by the build limits of the data sheet. Tools of 0.001, 0.002 or 0.01 mm,
 * calibrated to one to three of them, with a scatter of up to half of one; drawn again until the
 * ratio lies between 0.4 and 20, as with tools that somebody would take up for it, and no figure
 * given is nearly the answer.
 */
export const toolForLimits = sumOf({
	calculator: whichTool,
	parameters: toolForLimitsParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of, ask }, random, sheet) {
		const found = sheet.figure(of);
		if (!found.ok) return found;
		const { words, unit, least, most } = found.value;
		if (unit !== 'mm' || least === undefined || most === undefined)
			return cannot(`${words} has no two limits in the data sheet`);
		for (let tries = 0; tries < 40; tries++) {
			const leastCount = random.pick([0.001, 0.002, 0.01]);
			const calibration = shown(random.integer(1, 3) * leastCount, 3);
			const scatter = shown(random.between(0.2, 0.5) * leastCount, 4);
			const tool = { leastCountMm: leastCount, calibrationMm: calibration, scatterMm: scatter };
			const expanded = inHandMm(tool, 1);
			const ratio = (most - least) / 2 / expanded;
			const shownAlready = [calibration, scatter].some(
				(one) => ask === 'expanded' && Math.abs(one - expanded) < 0.08 * expanded
			);
			if (ratio < 0.4 || ratio > 20 || shownAlready) continue;
			const mm = { unit: 'mm', decimals: 3 };
			return computed({
				values: {
					least,
					most,
					room: undefined,
					readings: 1,
					tools: [{ name: 'The tool', leastCount, calibration, scatter }]
				},
				ask,
				given:
					ask === 'needed'
						? []
						: [
								{ words: 'Least count of the tool', value: leastCount, ...mm },
								{ words: 'Its calibration, U with k = 2', value: calibration, ...mm },
								{ words: 'Scatter s of your own repeats', value: scatter, unit: 'mm', decimals: 4 }
							],
				prompt: prompts[ask](words)
			});
		}
		return cannot(`no tool of this bench is for ${words}`);
	}
});

const prompts: Record<z.infer<typeof toolForLimitsParameters>['ask'], (words: string) => string> = {
	needed: (words) =>
		`“${words}” is to be ruled for a fresh build, by the limits of the data sheet. How large may the expanded uncertainty of a reading be at most, for a ratio of 4 to 1?`,
	expanded: (words) =>
		`You take one reading of “${words}” with this tool. What is its expanded uncertainty (k = 2), from scatter, least count and calibration?`,
	ratio: (words) =>
		`“${words}” is to be ruled for a fresh build, by the limits of the data sheet and one reading with this tool. What is its ratio, width of the limits over 2 U?`
};
