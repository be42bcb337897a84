import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect } from 'vitest';

export type Reference<T> = T & {
	id: string;
	quantity: string;
	expected: number;
	unit: string;
	tolerance: { kind: 'exact' | 'absolute' | 'relative'; value?: number };
	source: string;
	howObtained: string;
};

/** Published values, each with its source beside it, as `[name for the test, entry]`. */
export function referenceOf<T>(file: string): [string, Reference<T>][] {
	const path = join(import.meta.dirname, '../reference/workshop', file);
	const entries = JSON.parse(readFileSync(path, 'utf8')) as Reference<T>[];
	if (entries.length === 0) throw new Error(`${file} holds nothing`);
	return entries.map((one) => [`${one.id} ${one.quantity} (${one.source})`, one]);
}

/** Entries whose inputs stand as they were published, by the letters of their formula. */
export type Worked = Reference<{ inputs: Record<string, number> }>;

/** An input of a published entry; a missing one is a slip of the test's own. */
export function given({ id, inputs }: Pick<Worked, 'id' | 'inputs'>, name: string): number {
	const value = inputs[name];
	if (value === undefined) throw new Error(`${id} gives no ${name}`);
	return value;
}

/** Within what the published value is good for; "exact" leaves room for binary dust alone. */
export function expectWithin(value: number, { expected, tolerance }: Reference<unknown>): void {
	const { kind, value: width = 0 } = tolerance;
	const room =
		kind === 'exact'
			? Math.abs(expected) * 1e-12
			: kind === 'relative'
				? Math.abs(expected) * width
				: width;
	expect(Math.abs(value - expected)).toBeLessThanOrEqual(room + Math.abs(expected) * 1e-12);
}
