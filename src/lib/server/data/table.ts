import { DataTypes, type DataType, type ModelStatic, type Model, type Sequelize } from 'sequelize';

type Kind = 'text' | 'integer' | 'real' | 'json';

/** One column: what it is in the file, and (in the type only) what it is in the program. */
export type Column<T> = { kind: Kind; nullable: boolean; key: boolean; readonly is?: T };

export const text = <T extends string = string>(): Column<T> => column('text');
export const integer = (): Column<number> => column('integer');
export const real = (): Column<number> => column('real');
/** Stored as text; the shape is checked by the domain's schema where it is written. */
export const json = <T>(): Column<T> => column('json');
/** An instant as ISO 8601 in UTC: sorts as text and reads in any tool. */
export const instant = (): Column<string> => column('text');
export const key = (): Column<string> => ({ ...column<string>('text'), key: true });
export const nullable = <T>(inner: Column<T>): Column<T | null> => ({
	kind: inner.kind,
	nullable: true,
	key: inner.key
});

function column<T>(kind: Kind): Column<T> {
	return { kind, nullable: false, key: false };
}

// eslint-disable-next-line @typescript-eslint/no-explicit-any -- the column's type is invariant; any column may stand here
export type Columns = Record<string, Column<any>>;
export type Table<C extends Columns = Columns> = {
	name: string;
	columns: C;
	/** Rows that belong to a school carry `schoolId`, which the scope fills in and filters by. */
	schooled: boolean;
};
export type RowOf<T extends Table> = {
	[K in keyof T['columns']]: T['columns'][K] extends Column<infer V> ? V : never;
};

export function schoolTable<C extends Columns>(
	name: string,
	columns: C
): Table<C & { schoolId: Column<string> }> {
	return { name, columns: { schoolId: key(), ...columns }, schooled: true };
}

/** Accounts, sessions and the like: a person may belong to several schools. */
export function commonTable<C extends Columns>(name: string, columns: C): Table<C> {
	return { name, columns, schooled: false };
}

const dataTypes: Record<Kind, DataType> = {
	text: DataTypes.TEXT,
	integer: DataTypes.INTEGER,
	real: DataTypes.REAL,
	json: DataTypes.TEXT
};

export type Plain = Record<string, unknown>;

export function defineModel(sequelize: Sequelize, table: Table): ModelStatic<Model<Plain, Plain>> {
	const attributes = Object.fromEntries(
		Object.entries(table.columns).map(([name, one]) => [
			name,
			{ type: dataTypes[one.kind], allowNull: one.nullable, primaryKey: one.key }
		])
	);
	const made = sequelize.define<Model<Plain, Plain>>(table.name, attributes, {
		tableName: table.name,
		timestamps: false
	});
	// Tables without a key of their own must not be given Sequelize's invented "id".
	if (!Object.values(table.columns).some((one) => one.key)) made.removeAttribute('id');
	return made;
}

export function encode(table: Table, row: Plain): Plain {
	return mapJson(table, row, (value) => (value === null ? null : JSON.stringify(value)));
}

export function decode<T extends Table>(table: T, row: Plain): RowOf<T> {
	return mapJson(table, row, (value) =>
		typeof value === 'string' ? JSON.parse(value) : value
	) as RowOf<T>;
}

function mapJson(table: Table, row: Plain, change: (value: unknown) => unknown): Plain {
	const out: Plain = {};
	for (const [name, value] of Object.entries(row)) {
		const known = table.columns[name];
		out[name] = known?.kind === 'json' && value !== undefined ? change(value) : value;
	}
	return out;
}
