import { cannot, computed, type Outcome } from '../outcome';
import type { Bolt } from './bolt-pattern';

/** As many bolts as a pattern may have. */
const mostBolts = 60;

/**
 * The bolts of a head, a sump or a cover in even rows: A1, A2 … from the left, row A farthest up.
 *
 * @param rows, columns whole numbers, 60 bolts in all at most @param alongMm, acrossMm from bolt to
 *   bolt along a row and from row to row, mm, above zero where there are two
 * @returns places around the pattern's middle, mm
 * @example gridPattern(2, 4, 86, 90) // A1 at −129, 45 … B4 at 129, −45
 */
export function gridPattern(
	rows: number,
	columns: number,
	alongMm: number,
	acrossMm: number
): Outcome<Bolt[]> {
	if (!isCount(rows) || !isCount(columns) || rows > 26)
		return cannot('rows and columns are whole numbers, one or more');
	if (rows * columns < 2 || rows * columns > mostBolts)
		return cannot(`a pattern has two to ${mostBolts} bolts`);
	if (columns > 1 && !isLength(alongMm)) return cannot('the distance along a row is above zero');
	if (rows > 1 && !isLength(acrossMm)) return cannot('the distance between rows is above zero');
	const place = (at: number, count: number, by: number) =>
		count === 1 ? 0 : (at - (count - 1) / 2) * by;
	return computed(
		Array.from({ length: rows * columns }, (_, at) => {
			const [row, column] = [Math.floor(at / columns), at % columns];
			return {
				id: `${String.fromCharCode(65 + row)}${column + 1}`,
				xMm: place(column, columns, alongMm),
				yMm: -place(row, rows, acrossMm) + 0
			};
		})
	);
}

/**
 * The bolts of a flange, evenly around: 1 at the top, the rest clockwise.
 *
 * Formula: x = D/2 · sin(360° · i / n), y = D/2 · cos(360° · i / n).
 * @param count three to sixty @param diameterMm of the bolt circle, mm, above zero
 * @returns places around the middle, mm
 * Source: even division of a circle, by definition.
 * @example ringPattern(4, 100) // 1 at 0, 50; 2 at 50, 0 …
 */
export function ringPattern(count: number, diameterMm: number): Outcome<Bolt[]> {
	if (!isCount(count) || count < 3 || count > mostBolts)
		return cannot(`a flange has three to ${mostBolts} bolts`);
	if (!isLength(diameterMm)) return cannot('the bolt circle has a diameter above zero');
	return computed(
		Array.from({ length: count }, (_, at) => {
			const turn = (2 * Math.PI * at) / count;
			const round = (value: number) => Math.round(value * 1e4) / 1e4 + 0;
			return {
				id: String(at + 1),
				xMm: round((diameterMm / 2) * Math.sin(turn)),
				yMm: round((diameterMm / 2) * Math.cos(turn))
			};
		})
	);
}

function isCount(value: number): boolean {
	return Number.isInteger(value) && value >= 1;
}

function isLength(value: number): boolean {
	return value > 0 && value < 1e5;
}
