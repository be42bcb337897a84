import { cannot, computed, type Outcome } from '../outcome';

/**
 * Diameters in millimetres. Rows are depths along the part, columns are planes around it; a
 * reading not taken is null.
 */
export type DiameterGrid = readonly (readonly (number | null)[])[];

/** A hundred metres. */
const largestMm = 1e5;

/** All readings of a grid, or why it cannot be used. */
export function readingsOf(grid: DiameterGrid): Outcome<number[]> {
	const readings = grid.flat();
	const taken = readings.filter((one): one is number => one !== null);
	if (taken.length === 0) return cannot('no reading is taken yet');
	if (taken.length < readings.length)
		return cannot(`${readings.length - taken.length} of ${readings.length} readings are missing`);
	if (grid.some((row) => row.length !== grid[0]?.length))
		return cannot('each depth is measured in the same planes');
	if (taken.some((one) => !Number.isFinite(one) || one <= 0))
		return cannot('a diameter is a number above zero');
	// Sums of readings must stay numbers too.
	if (taken.some((one) => one > largestMm)) return cannot('no part on this bench is that large');
	return computed(taken);
}

/**
 * Out-of-round: the largest difference between planes at one depth.
 *
 * Formula: max over rows of (largest − smallest in the row).
 * @param grid mm, at least two planes
 * @returns mm
 * Source: method as in US Army TM 5-3805-262-34, p. 4-24 (second reading 90° from the first).
 * @example outOfRoundMm([[40.000, 39.988]]) // 0.012
 */
export function outOfRoundMm(grid: DiameterGrid): Outcome<number> {
	const all = readingsOf(grid);
	if (!all.ok) return all;
	const rows = grid as readonly (readonly number[])[];
	if (rows.some((row) => row.length < 2)) return cannot('out-of-round needs two planes');
	return computed(tidy(Math.max(...rows.map((row) => Math.max(...row) - Math.min(...row)))));
}

/**
 * Taper: the largest difference between depths in one plane.
 *
 * Formula: max over columns of (largest − smallest in the column).
 * @param grid mm, at least two depths
 * @returns mm
 * Source: method as in US Army TM 5-3805-262-34, p. 4-24.
 * @example taperMm([[40.000], [39.993]]) // 0.007
 */
export function taperMm(grid: DiameterGrid): Outcome<number> {
	const all = readingsOf(grid);
	if (!all.ok) return all;
	const rows = grid as readonly (readonly number[])[];
	if (rows.length < 2) return cannot('taper needs two depths');
	const planes = rows[0]?.map((_, plane) => rows.map((row) => row[plane] as number)) ?? [];
	return computed(tidy(Math.max(...planes.map((one) => Math.max(...one) - Math.min(...one)))));
}

/**
 * The smallest reading, mm: what a worn journal has left.
 * @example leastMm([[39.996, 39.981]]) // 39.981
 */
export function leastMm(grid: DiameterGrid): Outcome<number> {
	const all = readingsOf(grid);
	return all.ok ? computed(Math.min(...all.value)) : all;
}

/**
 * The largest reading, mm: how far a bore has worn.
 * @example mostMm([[74.012, 74.031]]) // 74.031
 */
export function mostMm(grid: DiameterGrid): Outcome<number> {
	const all = readingsOf(grid);
	return all.ok ? computed(Math.max(...all.value)) : all;
}

/** Differences of decimal readings leave binary dust; a nanometre is far below any instrument. */
export function tidy(valueMm: number): number {
	return Math.round(valueMm * 1e6) / 1e6;
}
