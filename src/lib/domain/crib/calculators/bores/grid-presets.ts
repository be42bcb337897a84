import type { DataSheet, Dimension } from '../../../data-sheets/schema';
import { dimensionOf } from '../../../data-sheets/value-of';
import type { Preset } from '../../calculator';
import type { Part } from './grid-shape';

/** Bores that are machined, or journals, with their limits and the sizes that they can be machined to. */
export function gridPresets(part: Part, sheet: DataSheet): Preset[] {
	return sheet.dimensions
		.filter((one) => (part === 'bore' ? isBore(one) : isJournal(one)))
		.map(({ key, words, nominal, build, runAgain }) => {
			const [family = ''] = key.split('.');
			const most = (name: string) => dimensionOf(sheet, `${family}.${name}`)?.runAgain?.most;
			const steps = sheet.oversizes.find((one) => one.of === key)?.stepsMm.join('; ');
			const [printed, wearLimit] =
				part === 'bore' ? [build?.most, runAgain?.most] : [build?.least, runAgain?.least];
			const values = {
				nominal,
				printed,
				wearLimit,
				outOfRoundMost: most('outOfRound'),
				taperMost: most('taper'),
				steps
			};
			return {
				key,
				words,
				values: Object.fromEntries(
					Object.entries(values).flatMap(([field, value]) =>
						value === undefined ? [] : [[field, String(value)]]
					)
				)
			};
		});
}

/** A bore that wears and is machined; a bearing's bore is neither. */
function isBore({ key, unit, nominal, runAgain }: Dimension): boolean {
	return (
		unit === 'mm' && /\.bore$/i.test(key) && nominal !== undefined && runAgain?.most !== undefined
	);
}

function isJournal({ key, unit, runAgain }: Dimension): boolean {
	return (
		unit === 'mm' &&
		/((pin|journal)\w*\.diameter|\.journal)$/i.test(key) &&
		runAgain?.least !== undefined
	);
}
