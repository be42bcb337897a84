import { computed, type Outcome } from '$lib/kernel/outcome';

/** All of several sums, or why the first of them cannot be computed. */
export function allOf<K extends string>(
	these: Record<K, Outcome<number>>
): Outcome<Record<K, number>> {
	const out: Partial<Record<K, number>> = {};
	for (const key of Object.keys(these) as K[]) {
		const found = these[key];
		if (!found.ok) return found;
		out[key] = found.value;
	}
	return computed(out as Record<K, number>);
}
