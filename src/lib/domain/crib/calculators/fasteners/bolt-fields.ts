import { propertyClasses, type PropertyClass } from '$lib/kernel/fasteners/strength';
import type { DataSheet, Fastener } from '../../../data-sheets/schema';
import { choice, quantity } from '../../field';
import type { Preset } from '../../calculator';

export const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
export const torque = {
	dimension: 'torque',
	unit: { metric: 'N·m', inch: 'lbf·ft' },
	decimals: 1
} as const;
export const force = { dimension: 'force', unit: { metric: 'kN', inch: 'lbf' } } as const;

export const diameter = quantity({
	...length,
	words: 'Thread, nominal diameter',
	hint: '10 for an M10.',
	decimals: 2,
	least: 1,
	most: 200,
	example: '10'
});
export const pitch = quantity({
	...length,
	words: 'Pitch',
	hint: 'From crest to crest, as a thread gauge shows it.',
	decimals: 2,
	least: 0.2,
	most: 12,
	example: '1.25'
});
const classOptions = propertyClasses.map((one) => ({ value: one, words: `Class ${one}` }));
export const propertyClass = choice({
	words: 'Property class, as stamped on the head',
	options: classOptions as { value: PropertyClass; words: string }[],
	example: '10.9'
});

/** Values of a sheet's bolts for fields of these names; the rest of a page stays as it is. */
export function boltPresets(
	sheet: DataSheet,
	values: (bolt: Fastener) => Record<string, string> | undefined
): Preset[] {
	return sheet.fasteners.flatMap((bolt) => {
		const found = values(bolt);
		return found ? [{ key: bolt.key, words: bolt.words, values: found }] : [];
	});
}

/** The last torque of a bolt's stages, N·m; undefined where all of them are angles. */
export function lastTorqueNm({ stages }: Pick<Fastener, 'stages'>): number | undefined {
	const torques = stages.flatMap((one) => ('torqueNm' in one ? [one.torqueNm] : []));
	return torques.at(-1);
}
