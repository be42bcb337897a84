import { taperMm } from '$lib/kernel/geometry/diameter-grid';
import { computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { drawAround, drawWorn, shown } from './draw-reading';
import type { Sum } from './sum';

/** Difference between the two ends of a journal or bore, on the worse axis. */
export const taperParameters = z.strictObject({ of: sheetKeySchema });

type Parameters = z.infer<typeof taperParameters>;
type Inputs = { readings: [number, number]; words: string; decimals: number };
const places = ['front end', 'rear end'];

export const taper: Sum<Parameters, Inputs> = {
	parameters: taperParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of }, random, sheet): Outcome<Inputs> {
		const figure = sheet.figure(of);
		if (!figure.ok) return figure;
		const size = drawWorn(figure.value, random);
		if (!size.ok) return size;
		const { words, decimals } = figure.value;
		const [a = 0, b = 0] = drawAround(size.value, decimals, 2, random);
		return computed({ readings: [a, b], words, decimals });
	},
	prompt: () => 'One plane was read at both ends. What is its taper?',
	given: ({ readings, words, decimals }) =>
		readings.map((value, i) => ({ words: `${words}, ${places[i]}`, value, unit: 'mm', decimals })),
	expected({ readings: [a, b], decimals }) {
		const found = taperMm([[a], [b]]);
		return found.ok ? computed({ value: found.value, unit: 'mm', decimals }) : found;
	},
	working({ readings: [a, b], decimals }) {
		const [most, least] = [Math.max(a, b), Math.min(a, b)];
		return [
			{
				words: 'The larger less the smaller',
				formula: `${most.toFixed(decimals)} − ${least.toFixed(decimals)}`,
				value: shown(most - least, decimals),
				unit: 'mm'
			}
		];
	}
};
