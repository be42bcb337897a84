import { cannot, computed, type Outcome } from '../outcome';

/** A bolt of a pattern, by its place in the plane of the joint. */
export type Bolt = { id: string; xMm: number; yMm: number };
export type Pattern = { bolts: readonly Bolt[]; printedOrder?: readonly string[] };

/** Closer than this no two bolts stand: the smallest washer is wider. */
const onePlaceMm = 1;
/** Distances from the middle that differ by less than this share of the largest count as one. */
const alike = 0.02;

/**
 * What is wrong with a bolt pattern; nothing where it is sound.
 *
 * @param pattern bolts by place, mm, and the maker's printed order where there is one
 * @returns sentences for the person who drew it
 * @example patternFaults({ bolts: [{ id: 'a', xMm: 0, yMm: 0 }, { id: 'b', xMm: 0.2, yMm: 0 }] })
 *   // ['a and b stand in one place']
 */
export function patternFaults({ bolts, printedOrder }: Pattern): string[] {
	if (bolts.length < 2) return ['a pattern has at least two bolts'];
	const placeless = bolts.filter(({ xMm, yMm }) => !(Math.hypot(xMm, yMm) < 1e6));
	if (placeless.length > 0) return placeless.map(({ id }) => `${id || 'a bolt'} has no place`);
	const ids = bolts.map(({ id }) => id);
	const twice = ids.filter((id, at) => ids.indexOf(id) < at);
	const faults = [...new Set(twice)].map((id) => `${id} is named twice`);
	for (const [at, a] of bolts.entries())
		for (const b of bolts.slice(at + 1))
			if (apartMm(a, b) < onePlaceMm) faults.push(`${a.id} and ${b.id} stand in one place`);
	if (printedOrder) {
		const missing = ids.filter((id) => !printedOrder.includes(id));
		if (missing.length > 0) faults.push(`the printed order leaves out ${missing.join(', ')}`);
		const unknown = printedOrder.filter((id) => !ids.includes(id));
		if (unknown.length > 0)
			faults.push(`the printed order names ${unknown.join(', ')}, which is not there`);
		const again = printedOrder.filter((id, at) => printedOrder.indexOf(id) < at);
		if (again.length > 0) faults.push(`the printed order names ${again.join(', ')} twice`);
	}
	return faults;
}

/** A pattern ready to be put in order: each bolt with its distance and direction from the middle. */
export type Placed = { id: string; reachMm: number; angleDeg: number; xMm: number; yMm: number };

/**
 * Bolts around the middle of their pattern, by name, so that nothing follows from the order in
 * which they were typed.
 *
 * @returns distance from the middle, mm, and direction, degrees; "cannot" with the first fault
 */
export function placedBolts(bolts: readonly Bolt[]): Outcome<Placed[]> {
	const [fault] = patternFaults({ bolts });
	if (fault) return cannot(fault);
	const mid = { x: mean(bolts.map((one) => one.xMm)), y: mean(bolts.map((one) => one.yMm)) };
	return computed(
		bolts
			.map(({ id, xMm, yMm }) => ({
				id,
				xMm,
				yMm,
				reachMm: Math.hypot(xMm - mid.x, yMm - mid.y),
				angleDeg: (Math.atan2(yMm - mid.y, xMm - mid.x) * 180) / Math.PI
			}))
			.sort((a, b) => byName(a.id, b.id))
	);
}

/** All at one distance around the middle, with no gap of a third of the turn more than its share: a flange. */
export function isRing(placed: readonly Placed[]): boolean {
	if (placed.length < 3) return false;
	const reach = mean(placed.map((one) => one.reachMm));
	if (placed.some((one) => Math.abs(one.reachMm - reach) > alike * reach)) return false;
	const angles = placed.map((one) => one.angleDeg).sort((a, b) => a - b);
	const gaps = angles.map((one, at) =>
		at === 0 ? one + 360 - (angles.at(-1) ?? 0) : one - (angles[at - 1] ?? 0)
	);
	return Math.max(...gaps) < 180;
}

/** How much two distances from the middle may differ and still be the same step outwards, mm. */
export function alikeMm(placed: readonly Placed[]): number {
	return alike * Math.max(...placed.map((one) => one.reachMm), 0);
}

export function apartMm(a: { xMm: number; yMm: number }, b: { xMm: number; yMm: number }): number {
	return Math.hypot(a.xMm - b.xMm, a.yMm - b.yMm);
}

/** "B2" before "B10". */
export function byName(a: string, b: string): number {
	return a.localeCompare(b, 'en', { numeric: true });
}

function mean(values: readonly number[]): number {
	return values.reduce((sum, one) => sum + one, 0) / values.length;
}
