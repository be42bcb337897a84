import { z } from 'zod';
import { shimPlan } from '$lib/kernel/geometry/shim-plan';
import { cannot, computed } from '$lib/kernel/outcome';
import { valveShims } from '../../crib/calculators/valve-shims';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const shimsToBuyParameters = z.strictObject({
	/** A lash with limits to build. */
	lash: sheetKeySchema
});

const sizes = { fromMm: 2, toMm: 3, stepMm: 0.02 };

/**
 * How few shims must be bought for four valves of one kind whose fitted shims may change places.
 * Shims 2.30 to 2.58 mm, lashes of at least 0.03 mm; drawn again until one to three must be bought
 * and at least one shim changes its valve, so that neither guess is always right.
 */
export const shimsToBuy = sumOf({
	calculator: valveShims,
	parameters: shimsToBuyParameters,
	sheetKeys: ({ lash }) => [lash],
	draw({ lash }, random, sheet) {
		const found = sheet.figure(lash);
		if (!found.ok) return found;
		const { words, unit, least, most } = found.value;
		if (unit !== 'mm' || least === undefined || most === undefined)
			return cannot(`${words} has no two limits in the data sheet`);
		const middle = (least + most) / 2;
		for (let tries = 0; tries < 400; tries++) {
			const wanted = [1, 2, 3, 4].map(() => 230 + 2 * random.integer(0, 14));
			const fitted = random
				.shuffle(wanted)
				.map((one) => (random.unit() < 0.4 ? 230 + 2 * random.integer(0, 14) : one));
			const valves = wanted.map((size, at) => {
				const shimMm = shown((fitted[at] ?? size) / 100, 2);
				const scatter = random.integer(-1, 1) / 100;
				const lashMm = shown(size / 100 + middle + scatter - shimMm, 2);
				return { name: `V${at + 1}`, shimMm, lashMm, leastMm: least, mostMm: most };
			});
			if (valves.some((one) => one.lashMm < 0.03 || one.lashMm > 0.6)) continue;
			const plan = shimPlan(valves, [], sizes);
			if (!plan.ok || plan.value.bought < 1 || plan.value.bought > 3) continue;
			if (plan.value.choices.every((one) => one.from !== 'valve')) continue;
			const mm = { unit: 'mm', decimals: 2 };
			return computed({
				values: {
					valves: valves.map(({ name, shimMm, lashMm }) => ({
						name,
						kind: 'in',
						shim: shimMm,
						lash: lashMm
					})),
					inletLeast: least,
					inletMost: most,
					exhaustLeast: undefined,
					exhaustMost: undefined,
					box: undefined,
					within: 'may-move' as const,
					from: sizes.fromMm,
					to: sizes.toMm,
					step: sizes.stepMm
				},
				ask: 'bought',
				given: valves.flatMap(({ name, shimMm, lashMm }) => [
					{ words: `${name}, shim fitted`, value: shimMm, ...mm },
					{ words: `${name}, lash measured`, value: lashMm, ...mm }
				]),
				prompt: `Four valves of one kind, and no loose shims. Fitted shims may change places, and new ones are sold from ${sizes.fromMm.toFixed(2)} to ${sizes.toMm.toFixed(2)} mm in steps of ${sizes.stepMm} mm. How many must be bought at least, for “${words}” within the limits of the data sheet on all four?`
			});
		}
		return cannot(`no four valves can be drawn for ${words}`);
	}
});
