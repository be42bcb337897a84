type Row = { costs: readonly number[]; price: number };
type Column = {
	at: number;
	price: number;
	holder?: Row;
	/** Least cost, in prices, at which the row that looks for a place gets here, and by way of which. */
	reach: number;
	before?: Column;
	settled: boolean;
};

/**
 * The cheapest way to give each row a column of its own: shortest augmenting paths with prices on
 * rows and columns (the Hungarian method), in time rows² · columns. Exact while costs are whole and
 * their sum stays below 2^53.
 *
 * @param costs finite, a cost for each row in each column, no fewer columns than rows
 * @returns the column of each row
 * @throws RangeError where the table is not of that shape or a cost is no number
 * Source: H. W. Kuhn (1955), the Hungarian method; R. Jonker and A. Volgenant (1987), the paths.
 * @example cheapestAssignment([[4, 1], [2, 3]]) // [1, 0]
 */
export function cheapestAssignment(costs: readonly (readonly number[])[]): number[] {
	const width = costs[0]?.length ?? 0;
	if (width < costs.length || costs.some((row) => row.length !== width))
		throw new RangeError('a cost for each row in each column, no fewer columns than rows');
	if (!costs.flat().every(Number.isFinite)) throw new RangeError('a cost is a number');
	const rows: Row[] = costs.map((line) => ({ costs: line, price: 0 }));
	const columns: Column[] = Array.from({ length: width }, (_, at) => ({
		at,
		price: 0,
		reach: Infinity,
		settled: false
	}));
	for (const row of rows) place(row, columns);
	const held = new Map(columns.map((one) => [one.holder, one.at]));
	return rows.map((row) => held.get(row) ?? -1);
}

/** Gives one more row a column, moving the rows before it where that is cheaper. */
function place(row: Row, columns: readonly Column[]): void {
	for (const one of columns) Object.assign(one, { reach: Infinity, settled: false });
	let from: Column | undefined;
	let mover: Row | undefined = row;
	let length = 0;
	while (mover) {
		let nearest: Column | undefined;
		for (const one of columns) {
			if (one.settled) continue;
			const through = length + (mover.costs[one.at] ?? 0) - mover.price - one.price;
			if (through < one.reach) {
				one.reach = through;
				one.before = from;
			}
			if (!nearest || one.reach < nearest.reach) nearest = one;
		}
		if (!nearest) return;
		nearest.settled = true;
		length = nearest.reach;
		from = nearest;
		mover = nearest.holder;
	}
	// Prices move so that what is held stays cheapest; then the row at each step of the path moves up.
	row.price += length;
	for (const one of columns)
		if (one.settled && one.holder) {
			one.price -= length - one.reach;
			one.holder.price += length - one.reach;
		}
	for (let one = from; one; one = one.before) one.holder = one.before ? one.before.holder : row;
}
