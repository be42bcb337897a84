import type { JobSheet } from '../job-sheets/schema';
import type { DataSheet } from './schema';
import { dimensionOf } from './value-of';

export type Lack = { key: string; says: string };

/**
 * What a sheet lacks before a job sheet can be worked on its engine: readings without a dimension,
 * results without limits to rule by.
 */
export function lacksFor(
	sheet: Pick<DataSheet, 'dimensions'>,
	{ grids, results }: Pick<JobSheet, 'grids' | 'results'>
): Lack[] {
	const readings = grids
		.filter(({ dimension }) => !dimensionOf(sheet, dimension))
		.map(({ dimension, title }) => ({
			key: dimension,
			says: `“${title}” is measured against ${dimension}, which the sheet does not have`
		}));
	const rulings = results.flatMap(({ limit, title }): Lack[] => {
		const found = dimensionOf(sheet, limit);
		if (!found)
			return [
				{ key: limit, says: `“${title}” is ruled by ${limit}, which the sheet does not have` }
			];
		return found.build || found.runAgain
			? []
			: [{ key: limit, says: `“${title}” is ruled by ${limit}, which has no limits` }];
	});
	return [...readings, ...rulings];
}
