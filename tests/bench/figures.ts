import type { Bolt } from '$lib/kernel/fasteners/tightening-order';
import type { ShimmedValve } from '$lib/kernel/geometry/shimmed-valve';

/** A bore at four depths in three planes, with its wear limit for shape. */
export const bore12 = {
	gridMm: [
		[74.021, 74.034, 74.026],
		[74.024, 74.041, 74.03],
		[74.017, 74.028, 74.02],
		[74.008, 74.013, 74.01]
	],
	expandedUncertaintyMm: 0.003,
	mostMm: 0.04
};

/** A cover of three rows of eight. */
export const bolts24: Bolt[] = [-60, 0, 60].flatMap((yMm, row) =>
	Array.from({ length: 8 }, (_, at) => ({
		id: `${'ABC'[row] ?? ''}${at + 1}`,
		xMm: (at - 3.5) * 55,
		yMm
	}))
);

export const valves16: {
	valves: ShimmedValve[];
	boxMm: number[];
	sizes: { fromMm: number; toMm: number; stepMm: number };
} = {
	valves: Array.from({ length: 16 }, (_, at) => ({
		name: `V${at + 1}`,
		shimMm: hundredths(230 + ((at * 7) % 16) * 2),
		lashMm: hundredths(12 + ((at * 5) % 11) * 2),
		leastMm: at % 2 ? 0.28 : 0.18,
		mostMm: at % 2 ? 0.32 : 0.22
	})),
	boxMm: Array.from({ length: 24 }, (_, at) => hundredths(226 + at * 2)),
	sizes: { fromMm: 2, toMm: 3, stepMm: 0.05 }
};

function hundredths(count: number): number {
	return count / 100;
}
