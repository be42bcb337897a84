import { cannot, computed, type Outcome } from '../outcome';

export type Bolt = { id: string; xMm: number; yMm: number };

/**
 * A sound order for a pattern for which the maker prints none: from the middle outwards, and at
 * each distance across before along.
 *
 * @returns bolt ids, tightened first to last
 * Source: centre-outward rule, common practice, no source. Where the maker prints an order it wins.
 */
export function orderFromMiddle(bolts: readonly Bolt[]): Outcome<string[]> {
	if (bolts.length < 2) return cannot('a pattern has at least two bolts');
	if (bolts.some(({ xMm, yMm }) => !Number.isFinite(xMm + yMm)))
		return cannot('each bolt has a place');
	if (new Set(bolts.map(({ id }) => id)).size < bolts.length)
		return cannot('a bolt is named twice');
	const mid = {
		x: mean(bolts.map((one) => one.xMm)),
		y: mean(bolts.map((one) => one.yMm))
	};
	const left = [...bolts];
	const out: Bolt[] = [];
	const reach = (one: Bolt) => Math.hypot(one.xMm - mid.x, one.yMm - mid.y);
	while (left.length > 0) {
		const nearest = Math.min(...left.map(reach));
		const ring = left.filter((one) => reach(one) <= nearest + 1e-6);
		const last = out.at(-1);
		const next = last
			? ring.reduce((best, one) => (apart(one, last) > apart(best, last) ? one : best))
			: ring[0];
		if (!next) break;
		out.push(next);
		left.splice(left.indexOf(next), 1);
	}
	return computed(out.map((one) => one.id));
}

/** The reverse: what was tightened last is loosened first. */
export function loosening(tightening: readonly string[]): string[] {
	return [...tightening].reverse();
}

export type Departure = { step: number; was: string; wanted: string };

/**
 * The first step at which an order departs from a printed one, or none.
 *
 * @param wanted ids in the printed order @param given ids in the student's
 * @returns step counted from 1; "cannot" where a bolt is missing, unknown or named twice
 * @example firstWrongStep(['a', 'b', 'c'], ['a', 'c', 'b']) // { step: 2, was: 'c', wanted: 'b' }
 */
export function firstWrongStep(
	wanted: readonly string[],
	given: readonly string[]
): Outcome<Departure | null> {
	if (new Set(given).size < given.length) return cannot('a bolt is named twice');
	if (given.some((id) => !wanted.includes(id))) return cannot('there is no such bolt');
	const missing = wanted.length - given.length;
	if (missing > 0)
		return cannot(missing === 1 ? '1 bolt is missing' : `${missing} bolts are missing`);
	const at = wanted.findIndex((id, step) => given[step] !== id);
	if (at < 0) return computed(null);
	return computed({ step: at + 1, was: given[at] ?? '', wanted: wanted[at] ?? '' });
}

function mean(values: readonly number[]): number {
	return values.reduce((sum, one) => sum + one, 0) / values.length;
}

function apart(a: Bolt, b: Bolt): number {
	return Math.hypot(a.xMm - b.xMm, a.yMm - b.yMm);
}
