import { z } from 'zod';
import { cannot, computed } from '$lib/kernel/outcome';
import { gaugingThread } from '../../crib/calculators/gauging-thread';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const threadParameters = z.strictObject({
	/** An oil clearance with limits to build and a wear limit. */
	of: sheetKeySchema,
	ask: z.enum(['mean', 'taper'])
});

/**
 * A gauging thread read at three places, in thousandths, between 0.015 mm and the wear limit; they
 * differ by 0.004 mm or more, and no reading is the answer.
 */
export const thread = sumOf({
	calculator: gaugingThread,
	parameters: threadParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of, ask }, random, sheet) {
		const found = sheet.figure(of);
		if (!found.ok) return found;
		const { words, least, most, wearLimit = most } = found.value;
		if (least === undefined || wearLimit === undefined)
			return cannot(`${words} has no limits in the data sheet`);
		for (let tries = 0; tries < 60; tries++) {
			const middle = random.between(least, wearLimit);
			const reads = [0, 1, 2].map(() => shown(middle + random.integer(-9, 9) / 1000, 3));
			const [low, high] = [Math.min(...reads), Math.max(...reads)];
			const mean = reads.reduce((sum, one) => sum + one, 0) / reads.length;
			const answer = ask === 'mean' ? mean : high - low;
			const isShown = reads.some((one) => Math.abs(one - answer) < 0.0006);
			if (low < 0.015 || high > wearLimit || high - low < 0.004 || isShown) continue;
			return computed({
				values: {
					how: 'clearances',
					reads,
					scale: undefined,
					buildLeast: undefined,
					buildMost: undefined,
					runMost: undefined,
					uncertainty: undefined
				},
				ask,
				given: reads.map((value, at) => ({
					words: `Clearance on the pack’s scale, ${places[at]}`,
					value,
					unit: 'mm',
					decimals: 3
				})),
				prompt:
					ask === 'mean'
						? 'A gauging thread was pressed flat and read at three places. What is the mean clearance?'
						: 'A gauging thread was pressed flat along the pin and read at three places. What is the taper that it shows?'
			});
		}
		return cannot('the thread would show nothing worth asking about');
	}
});

const places = ['front end', 'middle', 'rear end'];
