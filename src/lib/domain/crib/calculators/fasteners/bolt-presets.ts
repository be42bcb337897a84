import { nutFactorOf } from '../../../data-sheets/nut-factors';
import type { DataSheet, Fastener } from '../../../data-sheets/schema';
import type { Preset } from '../../calculator';

/** Values of a sheet's bolts for fields of these names; the rest of a page stays as it is. */
export function boltPresets(
	sheet: DataSheet,
	values: (bolt: Fastener) => Record<string, string> | undefined
): Preset[] {
	return sheet.fasteners.flatMap((bolt) => {
		const found = values(bolt);
		return found
			? [{ key: bolt.key, words: bolt.words, values: { ...threadValues(bolt), ...found } }]
			: [];
	});
}

function threadValues({ thread, propertyClass }: Fastener): Record<string, string> {
	return {
		diameter: String(thread.diameterMm),
		pitch: String(thread.pitchMm),
		threads: '',
		propertyClass
	};
}

/** Nut factors of a bolt: its own where the sheet gives them, else those of its lubrication. */
export function factorValues(bolt: Fastener): Record<string, string> {
	const { least, most } = nutFactorOf(bolt);
	return { leastFactor: String(least), mostFactor: String(most) };
}

/** The last torque of a bolt's stages, N·m; undefined where all of them are angles. */
export function lastTorqueNm({ stages }: Pick<Fastener, 'stages'>): number | undefined {
	return stages.flatMap((one) => ('torqueNm' in one ? [one.torqueNm] : [])).at(-1);
}

/** The angles of a bolt's stages, degrees. */
export function anglesDeg({ stages }: Pick<Fastener, 'stages'>): number[] {
	return stages.flatMap((one) => ('angleDeg' in one ? [one.angleDeg] : []));
}
