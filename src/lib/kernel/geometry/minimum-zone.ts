import { cannot, computed, type Outcome } from '../outcome';
import { tidy } from './diameter-grid';
import { touchingPlanes, type Scaled } from './touching-planes';

/** A place on a face, seen from above, and the height read there. */
export type FacePoint = { xMm: number; yMm: number; zMm: number };
export type Plane = { perX: number; perY: number; atOriginMm: number };
export type MinimumZone = {
	widthMm: number;
	/** The lower of the two planes: z = atOriginMm + perX · x + perY · y. */
	lower: Plane;
	/** The readings that the planes rest on: the width is the sum of weight times height. */
	held: { at: number; weight: number }[];
};

const largestMm = 1e5;

/**
 * The two parallel planes that lie closest together with every reading between them. Exact, not a
 * fit: a plane laid by least squares gives a width that is as large or larger, never smaller.
 *
 * Heights are compared as the dial reads them. While the face lies level within 1 mm in 100 mm,
 * the width square to it is the same within 1 part in 10 000.
 *
 * Formula: the least w for which a, b, c exist with a·x + b·y + c ≤ z ≤ a·x + b·y + c + w at every
 * reading.
 * @param points mm, at least four that do not lie in one line
 * @returns mm; "cannot" where the readings make no face
 * Source: ISO 12781-1:2011, minimum zone reference planes; duality of linear programming.
 * @example minimumZone([{ xMm: 0, yMm: 0, zMm: 0 }, { xMm: 100, yMm: 0, zMm: 0.02 },
 *   { xMm: 0, yMm: 100, zMm: 0.02 }, { xMm: 100, yMm: 100, zMm: 0 }]) // 0.02 wide
 */
export function minimumZone(points: readonly FacePoint[]): Outcome<MinimumZone> {
	if (points.length < 4) return cannot('three readings always lie in a plane: take at least four');
	if (points.some((one) => [one.xMm, one.yMm, one.zMm].some((v) => !(Math.abs(v) <= largestMm))))
		return cannot('each reading has a place and a height in millimetres');
	const { scaled, x, y, z } = scaledTo(points);
	const planes = touchingPlanes(scaled);
	if (!planes) return cannot('the readings lie in one line: a face is read across as well');
	const [perX, perY] = [(planes.a * z.by) / x.by, (planes.b * z.by) / y.by];
	const weights = new Map<number, number>();
	for (const [which, { at, side }] of planes.touching.entries())
		weights.set(at, (weights.get(at) ?? 0) + side * (planes.weights[which] ?? 0));
	const held = [...weights]
		.filter(([, weight]) => Math.abs(weight) > 1e-9)
		.map(([at, weight]) => ({ at, weight }))
		.sort((one, other) => one.at - other.at);
	const width = held.reduce((sum, one) => sum + one.weight * (points[one.at]?.zMm ?? 0), 0);
	return computed({
		widthMm: tidy(Math.abs(width)),
		lower: { perX, perY, atOriginMm: z.mid + planes.c * z.by - perX * x.mid - perY * y.mid },
		held
	});
}

/** How far a reading stands above a plane, mm. */
export function abovePlaneMm(plane: Plane, { xMm, yMm, zMm }: FacePoint): number {
	return zMm - (plane.atOriginMm + plane.perX * xMm + plane.perY * yMm);
}

function scaledTo(points: readonly FacePoint[]) {
	const axis = (values: readonly number[]) => {
		const [least, most] = [Math.min(...values), Math.max(...values)];
		return { mid: (least + most) / 2, by: (most - least) / 2 || 1 };
	};
	const x = axis(points.map((one) => one.xMm));
	const y = axis(points.map((one) => one.yMm));
	const z = axis(points.map((one) => one.zMm));
	const scaled: Scaled = points.map((one) => ({
		x: (one.xMm - x.mid) / x.by,
		y: (one.yMm - y.mid) / y.by,
		z: (one.zMm - z.mid) / z.by
	}));
	return { scaled, x, y, z };
}
