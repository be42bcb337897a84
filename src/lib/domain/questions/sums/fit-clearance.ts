import { fitOf } from '$lib/kernel/geometry/fit';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { drawWorn, worked } from './draw-reading';
import type { Sum } from './sum';

/** Bore minus what runs in it, one reading of each: a piston at the stated height, a stem in a guide. */
export const fitClearanceParameters = z.strictObject({
	outer: sheetKeySchema,
	inner: sheetKeySchema
});

type Parameters = z.infer<typeof fitClearanceParameters>;
type Inputs = {
	outer: number;
	inner: number;
	outerWords: string;
	innerWords: string;
	decimals: number;
};

export const fitClearance: Sum<Parameters, Inputs> = {
	parameters: fitClearanceParameters,
	sheetKeys: ({ outer, inner }) => [outer, inner],
	draw({ outer, inner }, random, sheet): Outcome<Inputs> {
		const hole = sheet.figure(outer);
		if (!hole.ok) return hole;
		const shaft = sheet.figure(inner);
		if (!shaft.ok) return shaft;
		const [a, b] = [drawWorn(hole.value, random), drawWorn(shaft.value, random)];
		if (!a.ok) return a;
		if (!b.ok) return b;
		if (a.value <= b.value) return cannot('what runs in it is larger than its bore');
		return computed({
			outer: a.value,
			inner: b.value,
			outerWords: hole.value.words,
			innerWords: shaft.value.words,
			decimals: hole.value.decimals
		});
	},
	prompt: () => 'What is the clearance between the two?',
	given: ({ outer, inner, outerWords, innerWords, decimals }) => [
		{ words: outerWords, value: outer, unit: 'mm', decimals },
		{ words: innerWords, value: inner, unit: 'mm', decimals }
	],
	expected({ outer, inner, decimals }) {
		const between = betweenMm(outer, inner);
		return between.ok ? computed({ value: between.value, unit: 'mm', decimals }) : between;
	},
	working: ({ outer, inner, decimals }) => [
		{
			words: 'Bore less what runs in it',
			formula: `${outer.toFixed(decimals)} − ${inner.toFixed(decimals)}`,
			...worked(betweenMm(outer, inner), decimals),
			unit: 'mm'
		}
	]
};

/** One reading of each: least and most are the same. */
function betweenMm(outer: number, inner: number): Outcome<number> {
	const found = fitOf({ leastMm: outer, mostMm: outer }, { leastMm: inner, mostMm: inner });
	return found.ok ? computed(found.value.leastMm) : found;
}
