import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect } from 'vitest';

export type Published = {
	id: string;
	source: string;
	howObtained: string;
	tolerance: { abs?: number; rel?: number };
};

/** Cases of a file of published figures, by id, each with its source beside it. */
export function publishedIn<T>(file: string): (id: string) => Published & T {
	const path = join(import.meta.dirname, '../../reference/statistics', file);
	const cases = JSON.parse(readFileSync(path, 'utf8')) as (Published & T)[];
	return (id) => {
		const found = cases.find((one) => one.id === id);
		if (!found?.source) throw new Error(`${file} has no ${id} with a source`);
		return found;
	};
}

/** Within the published tolerance: the wider of the two where both are given. */
export function expectNear(
	value: number,
	wanted: number,
	{ abs = 0, rel = 0 }: Published['tolerance']
): void {
	expect(Math.abs(value - wanted)).toBeLessThanOrEqual(Math.max(abs, rel * Math.abs(wanted)));
}
