import { wearMm } from '$lib/kernel/geometry/wear';
import { computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { drawWorn, worked } from './draw-reading';
import type { Sum } from './sum';

/** How far a part has worn beyond its printed size: a journal below, a bore above. */
export const wearParameters = z.strictObject({ of: sheetKeySchema });

type Parameters = z.infer<typeof wearParameters>;
type Inputs = {
	reading: number;
	printed: number;
	growing: boolean;
	words: string;
	decimals: number;
};

export const wear: Sum<Parameters, Inputs> = {
	parameters: wearParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of }, random, sheet): Outcome<Inputs> {
		const figure = sheet.figure(of);
		if (!figure.ok) return figure;
		const size = drawWorn(figure.value, random);
		if (!size.ok) return size;
		const { least = 0, most = 0, wearsBy, words, decimals } = figure.value;
		const growing = wearsBy === 'growing';
		return computed({
			reading: size.value,
			printed: growing ? most : least,
			growing,
			words,
			decimals
		});
	},
	prompt: ({ growing }) =>
		`The worst reading is given. How far has it worn beyond its ${growing ? 'greatest' : 'least'} printed size to build?`,
	given: ({ reading, words, decimals }) => [
		{ words: `${words}, worst reading`, value: reading, unit: 'mm', decimals }
	],
	expected(inputs) {
		const worn = wornMm(inputs);
		return worn.ok ? computed({ value: worn.value, unit: 'mm', decimals: inputs.decimals }) : worn;
	},
	working(inputs) {
		const { reading, printed, growing, decimals } = inputs;
		return [
			{
				words: `Printed ${growing ? 'greatest' : 'least'} size, from the data sheet`,
				value: printed,
				unit: 'mm'
			},
			{
				words: 'Difference',
				formula: growing
					? `${reading.toFixed(decimals)} − ${printed.toFixed(decimals)}`
					: `${printed.toFixed(decimals)} − ${reading.toFixed(decimals)}`,
				...worked(wornMm(inputs), decimals),
				unit: 'mm'
			}
		];
	}
};

function wornMm({ growing, reading, printed }: Inputs): Outcome<number> {
	return wearMm(growing ? 'bore' : 'journal', reading, printed);
}
