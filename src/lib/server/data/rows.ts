import { Op, QueryTypes, type Order, type WhereOptions } from 'sequelize';
import type { Scope } from './scope';
import { decode, encode, type Plain, type RowOf, type Table } from './table';

type Value<V> = V | readonly V[] | { not: V } | { below: V } | { atMost: V } | { above: V };
export type Where<T extends Table> = { [K in keyof RowOf<T>]?: Value<RowOf<T>[K]> };
export type Listing<T extends Table> = {
	order?: readonly (readonly [keyof RowOf<T> & string, 'asc' | 'desc'])[];
	limit?: number;
	offset?: number;
};
type NewRow<T extends Table> = Omit<RowOf<T>, 'schoolId'> & { schoolId?: string | null };

/** Rows of one table as plain objects, always within the scope's school. */
export async function select<T extends Table>(
	scope: Scope,
	table: T,
	where: Where<T> = {},
	listing: Listing<T> = {}
): Promise<RowOf<T>[]> {
	const found = await scope.database.model(table).findAll({
		where: condition(scope, table, where),
		order: (listing.order ?? []).map(([name, way]) => [name, way]) as Order,
		limit: listing.limit,
		offset: listing.offset,
		transaction: scope.transaction,
		raw: true
	});
	return found.map((row) => decode(table, row as unknown as Plain));
}

export async function find<T extends Table>(
	scope: Scope,
	table: T,
	where: Where<T>,
	listing: Listing<T> = {}
): Promise<RowOf<T> | undefined> {
	const [first] = await select(scope, table, where, { ...listing, limit: 1 });
	return first;
}

export async function count<T extends Table>(scope: Scope, table: T, where: Where<T> = {}) {
	return scope.database.model(table).count({
		where: condition(scope, table, where),
		transaction: scope.transaction
	});
}

export async function insert<T extends Table>(scope: Scope, table: T, row: NewRow<T>) {
	await scope.database
		.model(table)
		.create(encode(table, owned(scope, table, row as Plain)), { transaction: scope.transaction });
}

export async function insertAll<T extends Table>(scope: Scope, table: T, rows: NewRow<T>[]) {
	if (rows.length === 0) return;
	await scope.database.model(table).bulkCreate(
		rows.map((row) => encode(table, owned(scope, table, row as Plain))),
		{ transaction: scope.transaction }
	);
}

/** @returns how many rows were changed: a condition in `where` makes this a compare-and-set. */
export async function update<T extends Table>(
	scope: Scope,
	table: T,
	where: Where<T>,
	change: Partial<RowOf<T>>
): Promise<number> {
	const [changed] = await scope.database.model(table).update(encode(table, change as Plain), {
		where: condition(scope, table, where),
		transaction: scope.transaction
	});
	return changed;
}

export async function remove<T extends Table>(scope: Scope, table: T, where: Where<T>) {
	return scope.database.model(table).destroy({
		where: condition(scope, table, where),
		transaction: scope.transaction
	});
}

/** A joined read. `:schoolId` is filled from the scope; a school's query must use it. */
export async function sql<R extends object>(
	scope: Scope,
	statement: string,
	values: Plain = {}
): Promise<R[]> {
	if (scope.kind === 'school' && !statement.includes(':schoolId'))
		throw new Error('A query in a school names :schoolId.');
	return scope.database.sequelize.query<R>(statement, {
		type: QueryTypes.SELECT,
		replacements: scope.kind === 'school' ? { ...values, schoolId: scope.schoolId } : values,
		transaction: scope.transaction
	});
}

function owned(scope: Scope, table: Table, row: Plain): Plain {
	if (!table.schooled) return row;
	if (scope.kind === 'school') return { ...row, schoolId: scope.schoolId };
	if (typeof row.schoolId !== 'string') throw new Error(`${table.name} needs a school`);
	return row;
}

function condition(scope: Scope, table: Table, where: Plain): WhereOptions {
	const wanted: Plain = {};
	for (const [name, value] of Object.entries(where)) {
		if (value === undefined) throw new Error(`${table.name}.${name}: undefined matches nothing`);
		wanted[name] = operand(value);
	}
	if (table.schooled && scope.kind === 'school') wanted.schoolId = scope.schoolId;
	return wanted as WhereOptions;
}

function operand(value: unknown): unknown {
	if (Array.isArray(value)) return { [Op.in]: value };
	if (value === null || typeof value !== 'object') return value;
	if ('not' in value) return { [Op.ne]: value.not };
	if ('below' in value) return { [Op.lt]: value.below };
	if ('atMost' in value) return { [Op.lte]: value.atMost };
	if ('above' in value) return { [Op.gt]: value.above };
	throw new Error('unknown condition');
}
