import { convert, type DimensionName, type UnitOf } from '$lib/kernel/quantity/units';
import { parseQuantity } from '$lib/kernel/quantity/parse-quantity';
import { readNumber } from '$lib/kernel/quantity/read-number';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { cellsOf, filledCells } from './cells';

export type System = 'metric' | 'inch';
/** What stands in a field: the text as typed, and the unit chosen beside it. */
export type Entry = { text: string; unit?: string };

type Common = {
	words: string;
	hint?: string;
	/** Left out, the sum goes on without it. */
	optional?: boolean;
	/** Asked, and then wanted, only while another field holds this: a flange has no rows. */
	only?: { field: string; is: string };
	/** What "Show an example" types here. */
	example: string;
	/** Stands in the field from the start, where one value is usual and safe. */
	initial?: string;
};
type Range = { least?: number; most?: number };
export type QuantityFace = Common &
	Range & {
		kind: 'quantity';
		dimension: DimensionName;
		unit: Record<System, string>;
		/** Below these places a value of the unit is not typed: taken values are printed with them. */
		decimals: number;
	};
export type NumberFace = Common & Range & { kind: 'number'; whole?: boolean };
export type ChoiceFace = Common & {
	kind: 'choice';
	options: readonly { value: string; words: string }[];
};
export type TextFace = Common & { kind: 'text'; most: number };
export type ListFace = Common & {
	kind: 'list';
	dimension: DimensionName;
	unit: Record<System, string>;
};
export type GridFace = Common & {
	kind: 'grid';
	dimension: DimensionName;
	unit: Record<System, string>;
	/** How the two directions are called: "Depth", "Plane". */
	row: string;
	column: string;
	rows: { from: number; least: number; most: number };
	columns: { from: number; least: number; most: number };
	/** Names of the first columns or rows, where they have better ones than a number. */
	rowNames?: readonly string[];
	columnNames?: readonly string[];
};
/** One column of a table: a bare figure in the table's unit, or a short text. */
export type TableColumn = {
	key: string;
	words: string;
	of: 'quantity' | 'number' | 'text';
	optional?: boolean;
};
export type TableFace = Common & {
	kind: 'table';
	columns: readonly TableColumn[];
	dimension: DimensionName;
	unit: Record<System, string>;
	/** What a row is called: "Valve". */
	row: string;
	rows: { from: number; least: number; most: number };
};
export type FieldFace =
	QuantityFace | NumberFace | ChoiceFace | TextFace | ListFace | GridFace | TableFace;

/** A field of a calculator and how what is typed in it is read. Quantities come out in its metric unit. */
export type Field<T> = FieldFace & { read: (entry: Entry, system: System) => Outcome<T> };
export type Fields = Record<string, Field<unknown>>;
export type ValuesOf<F extends Fields> = {
	[K in keyof F]: F[K] extends Field<infer T> ? T : never;
};

export type TableRow = Record<string, number | string | null>;

type Given<Face> = Omit<Face, 'kind'>;

/** A length, torque, pressure … `read` gives it in `unit.metric`. */
export function quantity(
	given: Given<QuantityFace> & { optional: true }
): Field<number | undefined>;
export function quantity(given: Given<QuantityFace>): Field<number>;
export function quantity(given: Given<QuantityFace>): Field<number | undefined> {
	return {
		...given,
		kind: 'quantity',
		read: (entry, system) => {
			const value = inMetric(given, entry, system);
			return value.ok ? inRange(given, value.value, given.unit.metric) : value;
		}
	};
}

/** A bare number: a factor, a count. */
export function number(given: Given<NumberFace> & { optional: true }): Field<number | undefined>;
export function number(given: Given<NumberFace>): Field<number>;
export function number(given: Given<NumberFace>): Field<number | undefined> {
	return {
		...given,
		kind: 'number',
		read({ text }) {
			const value = plainNumber(text);
			if (!value.ok) return value;
			if (given.whole && !Number.isInteger(value.value)) return cannot('a whole number is wanted');
			return inRange(given, value.value, '');
		}
	};
}

export function choice<const O extends readonly { value: string; words: string }[]>(
	given: Omit<Given<ChoiceFace>, 'options' | 'optional'> & { options: O }
): Field<O[number]['value']> {
	return {
		...given,
		kind: 'choice',
		read: ({ text }) =>
			given.options.some((one) => one.value === text)
				? computed(text as O[number]['value'])
				: cannot(`choose one: ${given.options.map((one) => one.words).join(', ')}`)
	};
}

export function words(given: Given<TextFace> & { optional: true }): Field<string | undefined>;
export function words(given: Given<TextFace>): Field<string>;
export function words(given: Given<TextFace>): Field<string | undefined> {
	return {
		...given,
		kind: 'text',
		read: ({ text }) =>
			text.length > given.most
				? cannot(`no more than ${given.most} characters`)
				: computed(text.trim())
	};
}

/** Several quantities in one line, between spaces or semicolons: "0.25; 0.5; 0.75". */
export function list(given: Given<ListFace> & { optional: true }): Field<number[] | undefined>;
export function list(given: Given<ListFace>): Field<number[]>;
export function list(given: Given<ListFace>): Field<number[] | undefined> {
	return {
		...given,
		kind: 'list',
		read: (entry, system) =>
			all(entry.text.split(/[;\s]+/).filter(Boolean), (text) =>
				inMetric(given, { ...entry, text }, system)
			)
	};
}

/** Readings by row and column; a cell left empty is null. */
export function grid(
	given: Given<GridFace> & { optional: true }
): Field<(number | null)[][] | undefined>;
export function grid(given: Given<GridFace>): Field<(number | null)[][]>;
export function grid(given: Given<GridFace>): Field<(number | null)[][] | undefined> {
	return {
		...given,
		kind: 'grid',
		read: (entry, system) =>
			all(filledCells(cellsOf(entry.text)), (cells, row) =>
				all(cells, (text, column) => {
					const value = cell(given, { ...entry, text }, system);
					return value.ok
						? value
						: cannot(`${given.row} ${row + 1}, ${given.column} ${column + 1}: ${value.because}`);
				})
			)
	};
}

/** Rows of mixed columns: a pattern's bolts, an engine's valves. Wholly empty rows are left out. */
export function table(given: Given<TableFace> & { optional: true }): Field<TableRow[] | undefined>;
export function table(given: Given<TableFace>): Field<TableRow[]>;
export function table(given: Given<TableFace>): Field<TableRow[] | undefined> {
	return {
		...given,
		kind: 'table',
		read: (entry, system) =>
			all(
				cellsOf(entry.text).filter((cells) => cells.some((text) => text.trim() !== '')),
				(cells, row) => readRow(given, cells, entry, row, system)
			)
	};
}

function readRow(
	given: Given<TableFace>,
	cells: readonly string[],
	entry: Entry,
	row: number,
	system: System
): Outcome<TableRow> {
	const found: TableRow = {};
	for (const [at, column] of given.columns.entries()) {
		const text = (cells[at] ?? '').trim();
		const where = `${given.row} ${row + 1}, ${column.words}`;
		if (text === '' && !column.optional) return cannot(`${where}: nothing stands there`);
		if (column.of === 'text') found[column.key] = text;
		else {
			const value =
				column.of === 'quantity'
					? cell(given, { ...entry, text }, system)
					: text === ''
						? computed(null)
						: plainNumber(text);
			if (!value.ok) return cannot(`${where}: ${value.because}`);
			found[column.key] = value.value;
		}
	}
	return computed(found);
}

type Measured = { dimension: DimensionName; unit: Record<System, string> };

function cell(given: Measured, entry: Entry, system: System): Outcome<number | null> {
	return entry.text.trim() === '' ? computed(null) : inMetric(given, entry, system);
}

/** What is typed, in the metric unit of the field. A unit typed beside the figure wins over the chosen one. */
function inMetric({ dimension, unit }: Measured, entry: Entry, system: System): Outcome<number> {
	const read = parseQuantity(entry.text, dimension, entry.unit ?? unit[system]);
	if (!read.ok) return read;
	return computed(
		convert(
			dimension,
			read.value.value,
			read.value.unit as UnitOf<DimensionName>,
			unit.metric as UnitOf<DimensionName>
		)
	);
}

function plainNumber(text: string): Outcome<number> {
	// A bare figure has no thousands that a comma could part: it is a decimal mark, as in millimetres.
	return readNumber(text, 'mm');
}

function inRange({ least, most }: Range, value: number, unit: string): Outcome<number> {
	const printed = (one: number) => (unit ? `${one} ${unit}` : String(one));
	if (least !== undefined && value < least)
		return cannot(`${printed(least)} is the least that makes sense`);
	if (most !== undefined && value > most)
		return cannot(`${printed(most)} is the most that makes sense`);
	return computed(value);
}

function all<A, B>(these: readonly A[], read: (one: A, at: number) => Outcome<B>): Outcome<B[]> {
	const out: B[] = [];
	for (const [at, one] of these.entries()) {
		const found = read(one, at);
		if (!found.ok) return found;
		out.push(found.value);
	}
	return computed(out);
}
