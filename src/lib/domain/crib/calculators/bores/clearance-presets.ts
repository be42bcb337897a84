import type { DataSheet } from '../../../data-sheets/schema';
import type { Preset } from '../../calculator';

/** The limits of every clearance, gap or float of a sheet whose key is of a kind. */
export function clearancePresets(sheet: DataSheet, keys: RegExp): Preset[] {
	return sheet.dimensions
		.filter(({ key, unit }) => unit === 'mm' && keys.test(key))
		.map(({ key, words, build, runAgain }) => ({
			key,
			words,
			values: {
				...(build ? { buildLeast: String(build.least), buildMost: String(build.most) } : {}),
				...(runAgain?.most === undefined ? {} : { runMost: String(runAgain.most) })
			}
		}));
}
