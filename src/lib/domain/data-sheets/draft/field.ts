import * as codecs from './codecs';
import type { Codec } from './codecs';

export type Choice = { value: string; words: string };

/** One thing to type of a sheet: where it lies in the sheet, and how it is typed. */
export type Field = {
	label: string;
	/** In the row's object: `build.least`. */
	path: string;
	codec: Codec;
	input: 'line' | 'text' | 'figure' | 'choice' | 'check' | 'table';
	hint?: string;
	/** Printed after a figure; `row` where the row's own unit is meant. */
	unit?: string;
	options?: readonly Choice[];
	/** The rows of the draft that one of is chosen. */
	optionsFrom?: 'partFamilies' | 'dimensions' | 'fasteners';
	/** Half a line beside its neighbour where there is room. */
	short?: true;
	/** Taken when the field is left: rows move by it, and must not move under the hand. */
	late?: true;
};
type Extra = Partial<Pick<Field, 'hint' | 'unit' | 'short' | 'late' | 'codec'>>;

export const line = (label: string, path: string, extra: Extra = {}): Field => ({
	label,
	path,
	codec: codecs.words,
	input: 'line',
	...extra
});

export const long = (label: string, path: string, hint?: string): Field => ({
	label,
	path,
	codec: codecs.words,
	input: 'text',
	...(hint ? { hint } : {})
});

export const figure = (label: string, path: string, unit?: string, extra: Extra = {}): Field => ({
	label,
	path,
	codec: codecs.figure,
	input: 'figure',
	short: true,
	...(unit ? { unit } : {}),
	...extra
});

export const choice = (
	label: string,
	path: string,
	options: readonly Choice[],
	extra: Extra = {}
): Field => ({ label, path, codec: codecs.words, input: 'choice', options, short: true, ...extra });

export const check = (label: string, path: string, hint?: string): Field => ({
	label,
	path,
	codec: codecs.check,
	input: 'check',
	...(hint ? { hint } : {})
});

export const oneOf = (
	label: string,
	path: string,
	optionsFrom: NonNullable<Field['optionsFrom']>
): Field => ({ label, path, codec: codecs.words, input: 'choice', optionsFrom });
