import type { Bolt } from '$lib/kernel/fasteners/bolt-pattern';
import { gridPattern, ringPattern } from '$lib/kernel/fasteners/pattern-shapes';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { choice, number, quantity, table, type TableRow } from '../../field';

const length = {
	dimension: 'length',
	unit: { metric: 'mm', inch: 'in' },
	decimals: 1,
	least: 0,
	most: 5000,
	optional: true
} as const;
const count = { whole: true, least: 1, most: 60, optional: true } as const;
const inRows = { field: 'shape', is: 'rows' };
const around = { field: 'shape', is: 'ring' };

/** How a bolt pattern is told: by places, by rows, or as a flange. */
export const patternFields = {
	shape: choice({
		words: 'Pattern',
		options: [
			{ value: 'places', words: 'Any, by the place of each bolt' },
			{ value: 'rows', words: 'Even rows: a head, a cover' },
			{ value: 'ring', words: 'Even around: a flange' }
		],
		initial: 'places',
		example: 'places'
	}),
	bolts: table({
		dimension: 'length',
		unit: { metric: 'mm', inch: 'in' },
		words: 'Bolts',
		hint: 'A name and a place each, from any corner; paste three columns from a spreadsheet.',
		row: 'Bolt',
		columns: [
			{ key: 'id', words: 'Name', of: 'text' },
			{ key: 'x', words: 'x', of: 'quantity' },
			{ key: 'y', words: 'y', of: 'quantity' }
		],
		rows: { from: 8, least: 2, most: 60 },
		optional: true,
		only: { field: 'shape', is: 'places' },
		example: 'A1_-129_45*A2_-43_45*A3_43_45*A4_129_45*B1_-129_-45*B2_-43_-45*B3_43_-45*B4_129_-45'
	}),
	rows: number({ ...count, words: 'Rows', only: inRows, most: 26, example: '2' }),
	columns: number({ ...count, words: 'Bolts in a row', only: inRows, example: '5' }),
	along: quantity({ ...length, words: 'Along a row, bolt to bolt', only: inRows, example: '86' }),
	across: quantity({
		...length,
		words: 'From row to row',
		hint: '0 where there is one row.',
		only: inRows,
		example: '90'
	}),
	count: number({ ...count, least: 3, words: 'Bolts around', only: around, example: '8' }),
	circle: quantity({
		...length,
		words: 'Bolt circle, diameter',
		only: around,
		example: '76'
	})
} as const;

type Told = {
	shape: 'places' | 'rows' | 'ring';
	bolts?: TableRow[] | undefined;
	rows?: number | undefined;
	columns?: number | undefined;
	along?: number | undefined;
	across?: number | undefined;
	count?: number | undefined;
	circle?: number | undefined;
};

/** The bolts of a pattern, whichever way it was told. */
export function boltsOf(told: Told): Outcome<Bolt[]> {
	if (told.shape === 'rows')
		return gridPattern(told.rows ?? 0, told.columns ?? 0, told.along ?? 0, told.across ?? 0);
	if (told.shape === 'ring') return ringPattern(told.count ?? 0, told.circle ?? 0);
	const bolts = (told.bolts ?? []).map(({ id, x, y }) => ({
		id: String(id ?? ''),
		xMm: typeof x === 'number' ? x : NaN,
		yMm: typeof y === 'number' ? y : NaN
	}));
	const spaced = bolts.find(({ id }) => /\s/.test(id));
	return spaced
		? cannot(`a bolt's name is one word, so that orders can be typed: “${spaced.id}” is not`)
		: computed(bolts);
}

/** Bolt names as they are typed in a row: between spaces, commas, semicolons or arrows. */
export function namesIn(text: string | undefined): string[] {
	return (text ?? '').split(/[\s,;→>]+/).filter(Boolean);
}
