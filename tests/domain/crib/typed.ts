import type { AnyCalculator } from '$lib/domain/crib/calculator';
import type { System } from '$lib/domain/crib/field';
import { exampleEntries, readEntries, type Read } from '$lib/domain/crib/read-entries';
import { isFigure, type Worked } from '$lib/domain/crib/worked';

/** A calculator with its example typed in, and some fields typed otherwise. */
export function typed(
	of: AnyCalculator,
	other: Record<string, string> = {},
	system: System = 'metric'
): Read {
	const entries = exampleEntries(of);
	for (const [key, text] of Object.entries(other)) entries[key] = { text };
	return readEntries(of, entries, system);
}

export function workedOf(
	of: AnyCalculator,
	other: Record<string, string> = {},
	system: System = 'metric'
): Worked {
	const { worked, faults, wanted } = typed(of, other, system);
	if (!worked?.ok)
		throw new Error(worked?.because ?? `${JSON.stringify(faults)} ${wanted.join(', ')}`);
	return worked.value;
}

/** Why it cannot be computed. */
export function refusalOf(of: AnyCalculator, other: Record<string, string>): string {
	const { worked, faults } = typed(of, other);
	if (worked?.ok !== false)
		throw new Error(`that was computed, or not read: ${JSON.stringify(faults)}`);
	return worked.because;
}

export function figureOf(worked: Worked, key: string): number {
	const line = worked.lines.find((one) => one.key === key);
	if (!line || !isFigure(line)) throw new Error(`no figure ${key}`);
	return line.value;
}
