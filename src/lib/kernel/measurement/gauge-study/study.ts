import { cannot, computed, type Outcome } from '../../outcome';

/**
 * Readings of a group: several people measure the same parts several times, in one unit.
 * `readings[person][trial][part]`.
 */
export type GaugeStudy = readonly (readonly (readonly number[])[])[];

export type Balanced = { people: number; trials: number; parts: number; all: number[] };

/** How many of each a study has, or why it is none. */
export function balanced(study: GaugeStudy): Outcome<Balanced> {
	const people = study.length;
	const trials = study[0]?.length ?? 0;
	const parts = study[0]?.[0]?.length ?? 0;
	if (people < 2) return cannot('a group is two people or more');
	if (trials < 2) return cannot('each part is measured twice or more by each person');
	if (parts < 2) return cannot('two parts or more are measured');
	if (Math.max(people, trials, parts) > 100) return cannot('at most 100 of each are taken');
	if (study.some((one) => one.length !== trials || one.some((row) => row.length !== parts)))
		return cannot('everybody measures each part equally often');
	const all = study.flat(2);
	if (!all.every(Number.isFinite)) return cannot('a reading is no number');
	// Squares of readings must stay numbers too.
	if (all.some((one) => Math.abs(one) > 1e100)) return cannot('no part is that large');
	return computed({ people, trials, parts, all });
}

export function mean(values: readonly number[]): number {
	return values.reduce((sum, one) => sum + one, 0) / values.length;
}

export function spread(values: readonly number[]): number {
	return Math.max(...values) - Math.min(...values);
}

/** The mean of each part over everybody's trials. */
export function partMeans(study: GaugeStudy): number[] {
	const rows = study.flat();
	return (rows[0] ?? []).map((_, part) => mean(rows.map((row) => row[part] as number)));
}
