import { z } from 'zod';
import { cannot, computed } from '$lib/kernel/outcome';
import { flatness } from '../../crib/calculators/flatness';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const cornerTwistParameters = z.strictObject({
	/** A face with a limit for its flatness. */
	of: sheetKeySchema
});

/**
 * How far the four corners of a face on jacks lie from one plane. Corners read 0.30 to 0.55 mm, in
 * hundredths, so that no reading is the answer; drawn again until the result lies between three
 * tenths of the limit to run again and twice of it.
 */
export const cornerTwist = sumOf({
	calculator: flatness,
	parameters: cornerTwistParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of }, random, sheet) {
		const found = sheet.figure(of);
		if (!found.ok) return found;
		const { words, unit, wearLimit, most } = found.value;
		const limit = wearLimit ?? most;
		if (unit !== 'mm' || limit === undefined) return cannot(`${words} has no limit in millimetres`);
		for (let tries = 0; tries < 200; tries++) {
			const [a = 0, b = 0, c = 0, d = 0] = [1, 2, 3, 4].map(() =>
				shown(random.integer(30, 55) / 100, 2)
			);
			const twist = Math.abs(a + d - b - c) / 2;
			if (twist < 0.3 * limit || twist > 2 * limit || twist >= 0.3) continue;
			const at = (where: string, value: number) => ({
				words: `Dial, ${where} corner`,
				value,
				unit: 'mm',
				decimals: 2
			});
			return computed({
				values: {
					how: 'heights' as const,
					along: [0, 260],
					across: [0, 90],
					readings: [
						[a, b],
						[c, d]
					],
					buildMost: undefined,
					runMost: undefined,
					stretch: undefined,
					stretchMost: undefined,
					uncertainty: undefined
				},
				ask: 'overall',
				given: [at('front left', a), at('front right', b), at('rear left', c), at('rear right', d)],
				prompt:
					'The face stands on three jacks on a surface plate, and a dial reads its four corners. How far apart do the two closest parallel planes lie that hold all four?'
			});
		}
		return cannot(`the limit of ${words} is none that four corners can be drawn for`);
	}
});
