/**
 * The numbers that satisfy as many linear equations: Gaussian elimination, the largest pivot first.
 *
 * @param rows coefficients, square @param right what each row comes to
 * @returns none where the equations do not settle every number
 * Source: textbook elimination with partial pivoting.
 * @example solved([[2, 0], [0, 4]], [2, 2]) // [1, 0.5]
 */
export function solved(
	rows: readonly (readonly number[])[],
	right: readonly number[]
): number[] | undefined {
	const left = rows.map((row, at) => [...row, right[at] ?? 0]);
	const size = left.length;
	const largest = Math.max(...rows.flat().map(Math.abs));
	for (let column = 0; column < size; column++) {
		let pivot = column;
		for (let row = column + 1; row < size; row++)
			if (Math.abs(cell(left, row, column)) > Math.abs(cell(left, pivot, column))) pivot = row;
		const head = left[pivot] ?? [];
		const by = cell(left, pivot, column);
		// Below this the rows say the same thing twice.
		if (!(Math.abs(by) > largest * 1e-12)) return undefined;
		left[pivot] = left[column] ?? [];
		left[column] = head;
		for (let row = 0; row < size; row++) {
			if (row === column) continue;
			const factor = cell(left, row, column) / by;
			left[row] = (left[row] ?? []).map((one, at) => one - factor * (head[at] ?? 0));
		}
	}
	return left.map((row, at) => (row[size] ?? 0) / (row[at] ?? 1));
}

function cell(of: readonly (readonly number[])[], row: number, column: number): number {
	return of[row]?.[column] ?? 0;
}
