import type { DataSheet } from '../../../data-sheets/schema';
import { dimensionOf } from '../../../data-sheets/value-of';

/** What the fields of this drawer have in common. */
export const length = {
	dimension: 'length',
	unit: { metric: 'mm', inch: 'in' },
	decimals: 2
} as const;
export const volume = {
	dimension: 'volume',
	unit: { metric: 'cm³', inch: 'in³' },
	decimals: 1
} as const;
export const pressure = { dimension: 'pressure', unit: { metric: 'bar', inch: 'psi' } } as const;
/** From the smallest model engine to the largest of a ship. */
export const boreRange = { least: 5, most: 1500 } as const;
export const strokeRange = { least: 5, most: 4000 } as const;
export const cm3 = { unit: 'cm³', decimals: 2 } as const;
export const ratioLetters = { words: 'Compression ratio, to 1', unit: '', decimals: 2 } as const;

/** The size that a sheet means, or the middle of its limits, typed as if by hand. */
export function middleOf(sheet: DataSheet, key: string): string | undefined {
	const value = middleNumber(sheet, key);
	return value === undefined ? undefined : String(Number(value.toFixed(4)));
}

export function middleNumber(sheet: DataSheet, key: string): number | undefined {
	const found = dimensionOf(sheet, key);
	if (found?.nominal !== undefined) return found.nominal;
	return found?.build ? (found.build.least + found.build.most) / 2 : undefined;
}

/** Only the values that the sheet has: a field that it says nothing of keeps what stands in it. */
export function stated(values: Record<string, string | undefined>): Record<string, string> {
	return Object.fromEntries(
		Object.entries(values).filter((one): one is [string, string] => one[1] !== undefined)
	);
}
