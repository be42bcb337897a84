import { outOfRoundMm } from '$lib/kernel/geometry/diameter-grid';
import { computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { drawAround, drawWorn, shown } from './draw-reading';
import type { Sum } from './sum';

/** Largest minus smallest of two readings across a journal or bore, at the worst station. */
export const outOfRoundParameters = z.strictObject({ of: sheetKeySchema });

type Parameters = z.infer<typeof outOfRoundParameters>;
type Inputs = { readings: [number, number]; words: string; decimals: number };
const places = ['in line with the throw', 'square to it'];

export const outOfRound: Sum<Parameters, Inputs> = {
	parameters: outOfRoundParameters,
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
	prompt: () => 'One end was read in two planes at right angles. How far is it out of round?',
	given: ({ readings, words, decimals }) =>
		readings.map((value, i) => ({ words: `${words}, ${places[i]}`, value, unit: 'mm', decimals })),
	expected({ readings: [a, b], decimals }) {
		const found = outOfRoundMm([[a, b]]);
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
