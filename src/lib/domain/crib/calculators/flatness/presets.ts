import type { DataSheet } from '../../../data-sheets/schema';
import type { Preset } from '../../calculator';

/** The limits of every face in a sheet: what is printed as most, to build and to run again. */
export function presetsOf(sheet: DataSheet): Preset[] {
	return sheet.dimensions
		.filter((one) => one.unit === 'mm' && /flatness$/i.test(one.key))
		.map(({ key, words, build, runAgain }) => ({
			key,
			words,
			values: {
				...(build ? { buildMost: String(build.most) } : {}),
				...(runAgain?.most === undefined ? {} : { runMost: String(runAgain.most) })
			}
		}));
}
