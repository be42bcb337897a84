import { solved } from './linear-equations';

/** Places and heights scaled to about one, so that one tolerance fits every face. */
export type Scaled = readonly { x: number; y: number; z: number }[];
/** A place and which of the two planes touches it there: 1 the upper, −1 the lower. */
export type Touch = { at: number; side: 1 | -1 };
export type TouchingPlanes = {
	/** Lower plane z = a·x + b·y + c, upper plane the same plus width. */
	a: number;
	b: number;
	c: number;
	touching: readonly Touch[];
	/** One for each touch: how much that reading has in the width. */
	weights: readonly number[];
};

/** Of heights scaled to one: far below any instrument, far above binary dust. */
const dust = 1e-10;

/**
 * The two parallel planes closest together with every point between them: a linear programme in
 * tilt, height and distance, solved by the simplex method on its dual. From four touches to the
 * next four, until no point lies outside; the distance only grows on the way.
 *
 * @returns none where all places lie in one line
 */
export function touchingPlanes(points: Scaled): TouchingPlanes | undefined {
	const start = spread(points);
	if (!start) return undefined;
	let touching: Touch[] = [
		{ at: start[0], side: 1 },
		{ at: start[0], side: -1 },
		{ at: start[1], side: 1 },
		{ at: start[2], side: 1 }
	];
	let weights = [1, 1, 0, 0];
	for (let turn = 0; turn < 200 * points.length; turn++) {
		const rows = touching.map((one) => rowOf(one, points));
		const planes = solved(
			rows,
			touching.map(({ at, side }) => side * (points[at]?.z ?? 0))
		);
		if (!planes) return undefined;
		const outside = firstOutside(points, planes);
		const [a = 0, b = 0, c = 0] = planes;
		if (!outside) return { a, b, c, touching, weights };
		const columns = rows.map((_, column) => rows.map((row) => row[column] ?? 0));
		const share = solved(columns, rowOf(outside, points)) ?? [];
		const leaves = leaving(share, weights, touching);
		const step = (weights[leaves] ?? 0) / (share[leaves] ?? 1);
		weights = weights.map((one, at) => (at === leaves ? step : one - step * (share[at] ?? 0)));
		touching = touching.map((one, at) => (at === leaves ? outside : one));
	}
	return undefined;
}

/** Three places that stand well apart, or none where all lie in one line. */
function spread(points: Scaled): [number, number, number] | undefined {
	const first = points[0] ?? { x: 0, y: 0 };
	const q = farthest(points, (one) => Math.hypot(one.x - first.x, one.y - first.y));
	const far = points[q] ?? first;
	const off = (one: { x: number; y: number }) =>
		Math.abs((far.x - first.x) * (one.y - first.y) - (far.y - first.y) * (one.x - first.x));
	const r = farthest(points, off);
	return off(points[r] ?? first) > 1e-6 ? [0, q, r] : undefined;
}

function farthest<T>(these: readonly T[], of: (one: T) => number): number {
	const values = these.map(of);
	return values.indexOf(Math.max(...values));
}

function rowOf({ at, side }: Touch, points: Scaled): number[] {
	const { x, y } = points[at] ?? { x: 0, y: 0 };
	return side === 1 ? [x, y, 1, 1] : [-x, -y, -1, 0];
}

/** The first, not the worst: Bland's rule, without which ties could turn in a circle for ever. */
function firstOutside(points: Scaled, planes: readonly number[]): Touch | undefined {
	const [a = 0, b = 0, c = 0, width = 0] = planes;
	for (const [at, { x, y, z }] of points.entries()) {
		const above = z - (a * x + b * y + c);
		if (above - width > dust) return { at, side: 1 };
		if (above < -dust) return { at, side: -1 };
	}
	return undefined;
}

/** The touch whose weight would fall below zero first; the lowest of those that tie. */
function leaving(
	share: readonly number[],
	weights: readonly number[],
	touching: readonly Touch[]
): number {
	const ranks = touching.map(({ at, side }) => 2 * at + (side === 1 ? 0 : 1));
	let best = -1;
	let least = Infinity;
	for (const [at, one] of share.entries()) {
		if (one <= 1e-11) continue;
		const ratio = (weights[at] ?? 0) / one;
		const tied = Math.abs(ratio - least) <= 1e-12;
		if (tied ? (ranks[at] ?? 0) > (ranks[best] ?? 0) : ratio > least) continue;
		best = at;
		least = ratio;
	}
	return best;
}
