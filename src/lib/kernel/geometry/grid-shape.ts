import { cannot, computed, type Outcome } from '../outcome';
import { readingsOf, tidy, type DiameterGrid } from './diameter-grid';

/** A reading with its place in the grid: depth and plane counted from 0. */
export type PlacedReading = { valueMm: number; depth: number; plane: number };

/**
 * Where a grid is smallest and where it is largest; the first such place where several are.
 *
 * @param grid mm, no reading missing
 * @returns both readings with depth and plane, counted from 0
 * @example extremesOf([[40.0, 39.988]]) // least 39.988 in plane 1, most 40.000 in plane 0
 */
export function extremesOf(
	grid: DiameterGrid
): Outcome<{ least: PlacedReading; most: PlacedReading }> {
	const all = readingsOf(grid);
	if (!all.ok) return all;
	const placed = (grid as readonly (readonly number[])[]).flatMap((row, depth) =>
		row.map((valueMm, plane): PlacedReading => ({ valueMm, depth, plane }))
	);
	return computed({
		least: placed.reduce((best, one) => (one.valueMm < best.valueMm ? one : best)),
		most: placed.reduce((best, one) => (one.valueMm > best.valueMm ? one : best))
	});
}

export type GridShape = {
	/** Mean diameter at each depth, mm. */
	profileMm: number[];
	/** First depth less last, mm: above zero where it narrows towards the last. */
	taperMm: number;
	/** Ends less middle, mm: above zero bell-mouthed (an hourglass as a journal), below zero a barrel. */
	endsLessMiddleMm: number;
	name: 'straight' | 'tapered' | 'bell-mouthed' | 'barrel';
};

/**
 * How a bore or journal changes along its depth: the mean of each depth, its taper, and whether
 * its ends stand wider or narrower than its middle.
 *
 * Formula: taper = first − last mean; ends − middle = (first + last)/2 − mean of the depths between.
 * @param grid mm, at least three depths
 * @param noticedMm what is still called straight, mm, zero or more: the uncertainty of a difference
 * @returns the profile, both measures (signed), and the shape that stands out, by the larger of the two
 * Source: deviations of cylindrical form as ISO 12180-1 names them; means of the depths are common practice.
 * @example shapeOf([[74.03], [74.01], [74.03]], 0.005) // bell-mouthed by 0.020
 */
export function shapeOf(grid: DiameterGrid, noticedMm: number): Outcome<GridShape> {
	const all = readingsOf(grid);
	if (!all.ok) return all;
	if (grid.length < 3) return cannot('the shape along a part needs three depths');
	if (!(noticedMm >= 0) || !Number.isFinite(noticedMm))
		return cannot('an uncertainty is a number, zero or more');
	const profileMm = (grid as readonly (readonly number[])[]).map(mean);
	const [first = 0, last = 0] = [profileMm[0], profileMm.at(-1)];
	const taperMm = tidy(first - last);
	const endsLessMiddleMm = tidy((first + last) / 2 - mean(profileMm.slice(1, -1)));
	const [taper, bulge] = [Math.abs(taperMm), Math.abs(endsLessMiddleMm)];
	const name =
		Math.max(taper, bulge) <= noticedMm + 1e-9
			? 'straight'
			: taper >= bulge
				? 'tapered'
				: endsLessMiddleMm > 0
					? 'bell-mouthed'
					: 'barrel';
	return computed({ profileMm: profileMm.map(tidy), taperMm, endsLessMiddleMm, name });
}

function mean(values: readonly number[]): number {
	return values.reduce((sum, one) => sum + one, 0) / values.length;
}
