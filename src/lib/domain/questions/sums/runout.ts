import { z } from 'zod';
import { cannot, computed } from '$lib/kernel/outcome';
import { runoutMm } from '$lib/kernel/geometry/runout';
import { runout as calculator } from '../../crib/calculators/runout';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const runoutParameters = z.strictObject({
	/** A runout with a limit. */
	of: sheetKeySchema,
	/** The dial's travel, half of it, or the middle off its axis from four readings. */
	ask: z.enum(['runout', 'half', 'eccentricity'])
});

/**
 * A shaft turned under a dial of 0.002 mm: a middle off its axis by up to the limit to run again,
 * with a little out-of-round. Drawn again until the runout lies between three tenths of that limit
 * and twice of it. The dial was set down with 0.30 to 0.60 mm on it, so that no reading is the answer.
 */
export const runout = sumOf({
	calculator,
	parameters: runoutParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of, ask }, random, sheet) {
		const found = sheet.figure(of);
		if (!found.ok) return found;
		const { words, unit, wearLimit, most } = found.value;
		const limit = wearLimit ?? most;
		if (unit !== 'mm' || limit === undefined) return cannot(`${words} has no limit in millimetres`);
		const count = ask === 'eccentricity' ? 4 : 8;
		for (let tries = 0; tries < 100; tries++) {
			const off = random.between(0.15, 1) * limit;
			const shape = random.between(0, 0.2) * off;
			const [high, lobe] = [random.between(0, 2 * Math.PI), random.between(0, 2 * Math.PI)];
			const steps = Array.from({ length: count }, (_, at) => {
				const turned = (at * 2 * Math.PI) / count;
				const read = off * Math.cos(turned - high) + shape * Math.cos(2 * (turned - lobe));
				return Math.round(read / 0.002);
			});
			const setDown = random.integer(150, 300) - Math.min(...steps);
			const reads = steps.map((one) => shown((one + setDown) * 0.002, 3));
			const travel = runoutMm(reads);
			if (
				!travel.ok ||
				travel.value < 0.3 * limit ||
				travel.value > 2 * limit ||
				travel.value >= 0.3
			)
				continue;
			return computed({
				values: {
					readings: reads.map((read) => ({ angle: null, read })),
					support: 'centres' as const,
					buildMost: undefined,
					runMost: undefined,
					uncertainty: undefined
				},
				ask,
				given: reads.map((value, at) => ({
					words: `Dial at ${(at * 360) / count}°`,
					value,
					unit: 'mm',
					decimals: 3
				})),
				prompt: prompts[ask]
			});
		}
		return cannot(`the limit of ${words} is none that a dial of 0.002 mm can be drawn for`);
	}
});

const prompts: Record<z.infer<typeof runoutParameters>['ask'], string> = {
	runout:
		'The shaft is turned once between centres under a dial. What is its runout, the total indicator reading?',
	half: 'The shaft is turned once between centres under a dial. What is its bend, if bend is stated as half of the runout?',
	eccentricity:
		'The shaft is turned between centres, and the dial is read at four quarters. How far does the middle of the section lie off the axis, when what is left of the readings is its own shape?'
};
