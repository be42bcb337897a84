import { z } from 'zod';
import { threadOf } from '$lib/kernel/fasteners/thread';
import { cannot, computed } from '$lib/kernel/outcome';
import { friction } from '../../crib/calculators/friction';
import { sheetKeySchema } from '../words';
import { finalTorqueOf } from './draw-bolt';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const torqueShareParameters = z.strictObject({
	/** A tightening with a torque stage. */
	tightening: sheetKeySchema,
	/** The preload by friction, or the share of the torque that goes one way. */
	ask: z.enum(['preload', 'pitch', 'thread', 'head'])
});

/**
 * Where the printed torque of a bolt goes: friction 0.10 to 0.16 in thread and under the head, each
 * to a hundredth; a face 1.4 to 1.7 times the bolt's diameter wide on a hole one millimetre larger
 * than the bolt.
 */
export const torqueShare = sumOf({
	calculator: friction,
	parameters: torqueShareParameters,
	sheetKeys: ({ tightening }) => [tightening],
	draw({ tightening, ask }, random, sheet) {
		const found = sheet.tightening(tightening);
		if (!found.ok) return found;
		const torque = finalTorqueOf(found.value);
		if (!torque.ok) return torque;
		const { threadDiameterMm: d, threadPitchMm: p, propertyClass, words } = found.value;
		const thread = threadOf(d, p);
		if (!thread.ok) return thread;
		const hole = d + 1;
		const outer = Math.round(random.between(1.4, 1.7) * d);
		if (outer <= hole) return cannot(`${words} is too small to ask about`);
		const threadFriction = shown(random.integer(10, 16) / 100, 2);
		const headFriction = shown(random.integer(10, 16) / 100, 2);
		const mm = { unit: 'mm', decimals: 2 };
		return computed({
			values: {
				diameter: d,
				pitch: p,
				threads: undefined,
				propertyClass,
				outer,
				hole,
				threadFriction,
				headFriction,
				torque: torque.value,
				wanted: undefined
			},
			ask,
			given: [
				...(ask === 'preload'
					? [{ words: `${words}, torque M`, value: torque.value, unit: 'N·m', decimals: 0 }]
					: []),
				{ words: 'Pitch P', value: p, ...mm },
				{
					words: 'Pitch diameter d2',
					value: shown(thread.value.pitchDiameterMm, 2),
					...mm
				},
				{ words: 'Mean bearing diameter Dkm', value: shown((outer + hole) / 2, 2), ...mm },
				{ words: 'Friction in the thread µG', value: threadFriction, unit: '', decimals: 2 },
				{ words: 'Friction under the head µK', value: headFriction, unit: '', decimals: 2 }
			],
			prompt: prompts[ask]
		});
	}
});

const rule =
	'The torque is M = F · (0.16 P + 0.58 d2 µG + Dkm/2 · µK); its three parts are the bolt’s, the thread’s and the head’s.';
const prompts: Record<z.infer<typeof torqueShareParameters>['ask'], string> = {
	preload: `How hard does this bolt pull at its printed torque? ${rule}`,
	pitch: `How much of the torque goes into stretching this bolt, in per cent? ${rule}`,
	thread: `How much of the torque does the friction in the thread eat, in per cent? ${rule}`,
	head: `How much of the torque does the friction under the head eat, in per cent? ${rule}`
};
