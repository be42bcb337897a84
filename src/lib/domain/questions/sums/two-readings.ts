import type { DiameterGrid } from '$lib/kernel/geometry/diameter-grid';
import { computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { drawAround, drawWorn, worked } from './draw-reading';
import type { Sum } from './sum';

const parameters = z.strictObject({ of: sheetKeySchema });
type Parameters = z.infer<typeof parameters>;
type Readings = [number, number];
type Inputs = { readings: Readings; words: string; decimals: number };

/** What two readings of one journal or bore differ by: in two planes, or at two ends. */
export function ofTwoReadings(given: {
	places: readonly [string, string];
	prompt: string;
	/** The two readings as they lie in a grid. */
	grid: (readings: Readings) => DiameterGrid;
	find: (grid: DiameterGrid) => Outcome<number>;
}): Sum<Parameters, Inputs> {
	const { places, prompt, grid, find } = given;
	return {
		parameters,
		sheetKeys: ({ of }) => [of],
		draw({ of }, random, sheet) {
			const figure = sheet.figure(of);
			if (!figure.ok) return figure;
			const size = drawWorn(figure.value, random);
			if (!size.ok) return size;
			const { words, decimals } = figure.value;
			const [a = 0, b = 0] = drawAround(size.value, decimals, 2, random);
			return computed({ readings: [a, b], words, decimals });
		},
		prompt: () => prompt,
		given: ({ readings, words, decimals }) =>
			readings.map((value, at) => ({
				words: `${words}, ${places[at]}`,
				value,
				unit: 'mm',
				decimals
			})),
		expected({ readings, decimals }) {
			const found = find(grid(readings));
			return found.ok ? computed({ value: found.value, unit: 'mm', decimals }) : found;
		},
		working: ({ readings, decimals }) => [
			{
				words: 'The larger less the smaller',
				formula: `${Math.max(...readings).toFixed(decimals)} − ${Math.min(...readings).toFixed(decimals)}`,
				...worked(find(grid(readings)), decimals),
				unit: 'mm'
			}
		]
	};
}
