import { oilClearance as clearanceOf } from '$lib/kernel/geometry/oil-clearance';
import { computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { drawAround, drawWorn, shown, worked } from './draw-reading';
import type { Sum } from './sum';

/** Bearing bore (shells in, cap tightened) minus journal, least or most over a grid. */
export const oilClearanceParameters = z.strictObject({
	bore: sheetKeySchema,
	journal: sheetKeySchema,
	ask: z.enum(['least', 'most'])
});

type Parameters = z.infer<typeof oilClearanceParameters>;
type Inputs = {
	ask: Parameters['ask'];
	bores: number[];
	pins: number[];
	boreWords: string;
	pinWords: string;
	decimals: number;
};

export const oilClearance: Sum<Parameters, Inputs> = {
	parameters: oilClearanceParameters,
	sheetKeys: ({ bore, journal }) => [bore, journal],
	draw({ bore, journal, ask }, random, sheet): Outcome<Inputs> {
		const outer = sheet.figure(bore);
		if (!outer.ok) return outer;
		const inner = sheet.figure(journal);
		if (!inner.ok) return inner;
		const pin = drawWorn(inner.value, random);
		if (!pin.ok) return pin;
		const { least = 0, most = 0, decimals } = outer.value;
		const middle = shown(random.between(least, most), decimals);
		return computed({
			ask,
			bores: drawAround(middle, decimals, 2, random),
			pins: drawAround(pin.value, decimals, 4, random),
			boreWords: outer.value.words,
			pinWords: inner.value.words,
			decimals
		});
	},
	prompt: ({ ask }) => `These were read at room temperature. What is the ${ask} oil clearance?`,
	given: ({ bores, pins, boreWords, pinWords, decimals }) => [
		...bores.map((value, i) => ({
			words: `${boreWords}, reading ${i + 1}`,
			value,
			unit: 'mm',
			decimals
		})),
		...pins.map((value, i) => ({
			words: `${pinWords}, reading ${i + 1}`,
			value,
			unit: 'mm',
			decimals
		}))
	],
	expected({ ask, bores, pins, decimals }) {
		const found = askedOf(ask, bores, pins);
		return found.ok ? computed({ value: found.value, unit: 'mm', decimals }) : found;
	},
	working({ ask, bores, pins, decimals }) {
		const [bore, pin] =
			ask === 'least'
				? [Math.min(...bores), Math.max(...pins)]
				: [Math.max(...bores), Math.min(...pins)];
		const [size, other] = ask === 'least' ? ['Smallest', 'largest'] : ['Largest', 'smallest'];
		return [
			{ words: `${size} bearing bore`, value: bore, unit: 'mm' },
			{ words: `The ${other} pin`, value: pin, unit: 'mm' },
			{
				words: 'Bore less pin',
				formula: `${bore.toFixed(decimals)} − ${pin.toFixed(decimals)}`,
				...worked(askedOf(ask, bores, pins), decimals),
				unit: 'mm'
			}
		];
	}
};

function askedOf(
	ask: Parameters['ask'],
	bores: readonly number[],
	pins: readonly number[]
): Outcome<number> {
	const found = clearanceOf([bores], [pins]);
	if (!found.ok) return found;
	return computed(ask === 'least' ? found.value.leastMm : found.value.mostMm);
}
