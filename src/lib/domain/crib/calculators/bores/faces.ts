import { grid, quantity } from '../../field';

/** What the fields of this drawer have in common. */
export const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
export const mm = { unit: 'mm', decimals: 3 } as const;
/** A mean says one place more than what it is taken from. */
export const fine = { unit: 'mm', decimals: 4 } as const;

/** Diameters by depth and plane. */
export function diameters(given: { words: string; hint: string; example: string }) {
	return grid({
		...length,
		...given,
		row: 'Depth',
		column: 'Plane',
		rows: { from: Math.min(3, given.example.split('*').length), least: 1, most: 12 },
		columns: { from: 2, least: 1, most: 12 }
	});
}

/** A limit of a clearance, a float or a difference; left out, it does not rule. */
export function limit(words: string, example: string, hint?: string) {
	return quantity({
		...length,
		words,
		example,
		...(hint === undefined ? {} : { hint }),
		decimals: 3,
		least: 0,
		most: 50,
		optional: true
	});
}

/** How well a reading is known, for the ruling. */
export function uncertaintyOf(words: string, example: string) {
	return quantity({
		...length,
		words,
		example,
		hint: 'Expanded uncertainty, k = 2. With it and a limit the result is ruled.',
		decimals: 4,
		least: 0,
		most: 1,
		optional: true
	});
}

/** A size of a part, above zero. */
export const size = { ...length, decimals: 3, least: 0.5, most: 2000 } as const;
