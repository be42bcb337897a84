import { computed, type Outcome } from '$lib/kernel/outcome';
import { partName, partOf, type FigurePart } from '../figure-words';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import type { Sum } from './sum';

/** A value to be read off the data sheet: no drawing of lots, the sheet is the question. */
export const sheetValueParameters = z.strictObject({
	of: sheetKeySchema,
	part: z.enum(['nominal', 'least', 'most', 'wearLimit'])
});

type Parameters = z.infer<typeof sheetValueParameters>;
type Inputs = { value: number; unit: string; decimals: number; words: string; part: FigurePart };

export const sheetValue: Sum<Parameters, Inputs> = {
	parameters: sheetValueParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of, part }, _random, sheet): Outcome<Inputs> {
		const figure = sheet.figure(of);
		if (!figure.ok) return figure;
		const value = partOf(figure.value, part);
		if (!value.ok) return value;
		const { unit, decimals, words } = figure.value;
		return computed({ value: value.value, unit, decimals, words, part });
	},
	prompt: ({ words, part }) =>
		`What does the data sheet print for “${words}”: the ${partName(part)}?`,
	given: () => [],
	expected: ({ value, unit, decimals }) => computed({ value, unit, decimals }),
	working: ({ words, part, value, unit }) => [
		{ words: `${words}: ${partName(part)}, as printed`, value, unit }
	]
};
