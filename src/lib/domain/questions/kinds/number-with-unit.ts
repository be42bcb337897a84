import { z } from 'zod';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { convert, dimensions, type DimensionName, type UnitOf } from '$lib/kernel/quantity/units';
import { seeded } from '$lib/kernel/random/random';
import { withUnit } from '../figure-words';
import { fillWords, keysIn } from '../fill-words';
import type { Kind } from '../kind';
import { readNumber } from '$lib/kernel/quantity/read-number';
import { sumNames, sums } from '../sums/registry';
import type { Expected, Given } from '../sums/sum';
import { wordsSchema } from '../words';

const positive = z.number().positive();

export const numberWithUnitBody = z
	.strictObject({
		/** Which sum; see `domain/questions/sums`. It draws the figures and has the kernel work it. */
		sum: z.enum(sumNames),
		/** The sum's own parameters: data-sheet keys and what is asked. */
		with: z.record(z.string(), z.unknown()),
		/** Leave out to use the sum's own words. */
		prompt: wordsSchema.optional(),
		/** In the sum's own unit, or as a fraction of the right value. */
		tolerance: z.union([
			z.strictObject({ absolute: positive }),
			z.strictObject({ relative: positive.max(0.2) })
		]),
		because: wordsSchema.optional()
	})
	.superRefine((body, context) => {
		const parsed = sums[body.sum].parameters.safeParse(body.with);
		if (!parsed.success)
			for (const issue of parsed.error.issues)
				context.addIssue({
					code: 'custom',
					path: ['with', ...issue.path],
					message: issue.message
				});
	});
export type NumberWithUnitBody = z.infer<typeof numberWithUnitBody>;

type Drawn = {
	inputs: unknown;
	prompt: string;
	because: string;
	given: Given[];
	expected: Expected;
};
export type NumberFace = {
	prompt: string;
	given: Given[];
	/** What may be answered in: right in another unit of the same kind is right. */
	units: string[];
	tolerance: string;
};
export type NumberResponse = { value: string; unit: string };

/** The kind of quantity that a unit belongs to, where there are others to answer in. */
function dimensionOf(unit: string): DimensionName | undefined {
	return (Object.keys(dimensions) as DimensionName[]).find((one) => unit in dimensions[one]);
}

function unitsFor(unit: string): string[] {
	const dimension = dimensionOf(unit);
	return dimension ? Object.keys(dimensions[dimension]) : [unit];
}

function inUnit(value: number, from: string, to: string): number {
	const dimension = dimensionOf(from);
	return dimension && from !== to
		? convert(dimension, value, from as UnitOf<typeof dimension>, to as UnitOf<typeof dimension>)
		: value;
}

function allowed(body: NumberWithUnitBody, expected: number): number {
	return 'absolute' in body.tolerance
		? body.tolerance.absolute
		: Math.abs(expected) * body.tolerance.relative;
}

export const numberWithUnit: Kind<NumberWithUnitBody, Drawn, NumberFace, NumberResponse> = {
	schema: numberWithUnitBody,
	responseSchema: z.strictObject({ value: z.string().max(40), unit: z.string().max(20) }),

	sheetKeys: (body) => [
		...sums[body.sum].sheetKeys(sums[body.sum].parameters.parse(body.with)),
		...keysIn(body.prompt, body.because)
	],
	draw(body, seed, sheet): Outcome<Drawn> {
		const sum = sums[body.sum];
		const inputs = sum.draw(sum.parameters.parse(body.with), seeded(`${seed}/figures`), sheet);
		if (!inputs.ok) return inputs;
		const expected = sum.expected(inputs.value);
		if (!expected.ok) return expected;
		if (!Number.isFinite(expected.value.value)) return cannot('the sum gives no number');
		const prompt = fillWords(body.prompt ?? sum.prompt(inputs.value), sheet);
		if (!prompt.ok) return prompt;
		const because = fillWords(body.because ?? '', sheet);
		if (!because.ok) return because;
		return computed({
			inputs: inputs.value,
			prompt: prompt.value,
			because: because.value,
			given: sum.given(inputs.value),
			expected: expected.value
		});
	},

	face: (body, { prompt, given, expected }) => ({
		prompt,
		given,
		units: unitsFor(expected.unit),
		tolerance:
			'absolute' in body.tolerance
				? `Right within ${body.tolerance.absolute} ${expected.unit}.`
				: `Right within ${body.tolerance.relative * 100} %.`
	}),

	score(body, { expected }, response) {
		const read = readNumber(response.value, response.unit);
		const wrong = (explain: string) => ({ points: 0, right: false, explain });
		if (!read.ok) return wrong(`“${response.value}” cannot be read as a number: ${read.because}.`);
		const value = read.value;
		const margin = allowed(body, expected.value) + 1e-9;
		if (!unitsFor(expected.unit).includes(response.unit))
			return wrong(`“${response.unit}” is no unit for this. ${expected.unit} was wanted.`);
		const off = Math.abs(inUnit(value, response.unit, expected.unit) - expected.value);
		if (off <= margin) return { points: 1, right: true, explain: 'Right.' };
		if (response.unit !== expected.unit && Math.abs(value - expected.value) <= margin)
			return wrong(`The figure is right in ${expected.unit}, but you gave it in ${response.unit}.`);
		return wrong(`It is off by ${off.toPrecision(2)} ${expected.unit}.`);
	},

	answer: (_, { expected }) => ({
		words: withUnit(expected.value, expected.decimals, expected.unit)
	}),
	said: (_body, _drawn, { value, unit }) =>
		value.trim() === '' ? 'nothing given' : `${value} ${unit}`,
	working: (body, { inputs, because }) => [
		...sums[body.sum].working(inputs),
		...(because ? [{ words: because }] : [])
	],
	emptyIsOmitted: ({ value }) => value.trim() === ''
};
