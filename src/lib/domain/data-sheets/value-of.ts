import { keyedThings, type DataSheet, type Dimension, type Fastener, type Pattern } from './schema';

/** A dimension by its key, such as `crankpin.oilClearance`. */
export function dimensionOf(
	sheet: Pick<DataSheet, 'dimensions'>,
	key: string
): Dimension | undefined {
	return sheet.dimensions.find((one) => one.key === key);
}

export function fastenerOf(sheet: DataSheet, key: string): Fastener | undefined {
	return sheet.fasteners.find((one) => one.key === key);
}

export function patternOf(sheet: DataSheet, key: string): Pattern | undefined {
	return sheet.patterns.find((one) => one.key === key);
}

/** Every key that a lesson, question or job sheet may name. */
export function keysOf(sheet: DataSheet): Set<string> {
	return new Set(keyedThings(sheet).map((one) => one.key));
}

/** The limits that answer a question: to build anew, or to run again as it is. */
export function limitsFor(
	dimension: Dimension,
	question: 'build' | 'run-again'
): { least?: number; most?: number } {
	if (question === 'build') return dimension.build ?? {};
	// What has no wear limit of its own is held to its build limits.
	return dimension.runAgain ?? dimension.build ?? {};
}
