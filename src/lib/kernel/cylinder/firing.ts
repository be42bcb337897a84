import { cannot, computed, type Outcome } from '../outcome';

export type Cycle = 'four-stroke' | 'two-stroke';
/** Crank degrees from one firing of a cylinder to its next. */
export const cycleDeg: Record<Cycle, number> = { 'four-stroke': 720, 'two-stroke': 360 };

/**
 * Interval of an engine that fires evenly.
 *
 * Formula: four-stroke 720° / n, two-stroke 360° / n.
 * @param cylinders n, a whole number from 1
 * @returns degrees of crank
 * Source: definition; reference entries F01 and F03.
 * @example evenIntervalDeg(3, 'four-stroke') // 240
 */
export function evenIntervalDeg(cylinders: number, cycle: Cycle): Outcome<number> {
	if (!Number.isInteger(cylinders) || cylinders < 1 || cylinders > 64)
		return cannot('an engine has a whole number of cylinders');
	return computed(cycleDeg[cycle] / cylinders);
}

/**
 * How far apart the intervals of an engine lie.
 *
 * @param firings as `firingsOf` gives them
 * @returns the shortest and the longest, degrees, and whether they are all alike
 * @example intervalsOf(firings) // { leastDeg: 180, mostDeg: 540, even: false }
 */
export function intervalsOf(firings: readonly Firing[]): {
	leastDeg: number;
	mostDeg: number;
	even: boolean;
} {
	const all = firings.map((one) => one.toNextDeg);
	if (all.length === 0) throw new RangeError('an engine fires');
	const [leastDeg, mostDeg] = [Math.min(...all), Math.max(...all)];
	return { leastDeg, mostDeg, even: mostDeg - leastDeg < 1e-6 };
}

export type Firing = { cylinder: number; atDeg: number; toNextDeg: number };

/**
 * When each cylinder fires, from its crank throw and the firing order.
 *
 * Formula: each fires when its throw stands at top dead centre: the next such angle after the one before.
 * @param throwsDeg the angle of each cylinder's throw behind cylinder 1's in the sense of rotation,
 *   degrees, by cylinder from 1 (bank angle included for a V)
 * @param order every cylinder once, beginning with any
 * @returns the firings in order with crank angle from the first and the interval to the next; they
 *   make one whole cycle. "cannot" where the order cannot be fired within one cycle on that crank
 * Source: geometry of the crank; orders as reference entries F10 to F15.
 * @example firingsOf([0, 180, 180, 0], [1, 3, 4, 2], 'four-stroke') // every 180°
 */
export function firingsOf(
	throwsDeg: readonly number[],
	order: readonly number[],
	cycle: Cycle
): Outcome<Firing[]> {
	const fault = orderFault(throwsDeg.length, order);
	if (fault) return cannot(fault);
	if (throwsDeg.some((one) => !(Math.abs(one) <= 7200)))
		return cannot('each throw stands at an angle in degrees');
	const full = cycleDeg[cycle];
	const throwOf = (cylinder: number) => throwsDeg[cylinder - 1] ?? 0;
	const firings: Firing[] = [];
	let at = 0;
	for (const [place, cylinder] of order.entries()) {
		const next = order[(place + 1) % order.length] ?? cylinder;
		const apart = turned(throwOf(next) - throwOf(cylinder), 360);
		// One throw at the same angle as the one before fires a whole turn later, never at once.
		const toNextDeg = place === order.length - 1 ? full - at : apart < 1e-9 ? 360 : apart;
		firings.push({ cylinder, atDeg: at, toNextDeg });
		at += place === order.length - 1 ? 0 : toNextDeg;
	}
	const last = firings.at(-1);
	const first = order[0] ?? 1;
	const closes = last && turned(throwOf(first) - throwOf(last.cylinder) - last.toNextDeg, 360);
	if (!last || !(last.toNextDeg > 0) || (closes ?? 1) > 1e-6)
		return cannot(`this order cannot be fired within one ${cycle} cycle on these throws`);
	return computed(firings);
}

/**
 * Cylinders that come to top dead centre together, one firing while the other changes gas.
 *
 * @param order an even number of cylinders that fire evenly, each once
 * @returns pairs, the lower number first, half a cycle apart in the order
 * Source: reference entries F16 and F17.
 * @example companions([1, 5, 3, 6, 2, 4]) // [[1, 6], [2, 5], [3, 4]]
 */
export function companions(order: readonly number[]): Outcome<[number, number][]> {
	const fault = orderFault(order.length, order);
	if (fault) return cannot(fault);
	if (order.length % 2 === 1) return cannot('an odd number of cylinders has no pairs');
	const half = order.length / 2;
	const pairs = order.slice(0, half).map((one, at): [number, number] => {
		const other = order[at + half] ?? one;
		return one < other ? [one, other] : [other, one];
	});
	return computed(pairs.sort((a, b) => a[0] - b[0]));
}

/** What is wrong with a firing order for so many cylinders, or nothing. */
export function orderFault(cylinders: number, order: readonly number[]): string | undefined {
	if (cylinders < 1) return 'an engine has at least one cylinder';
	if (order.length !== cylinders)
		return `the order names ${order.length} of ${cylinders} cylinders`;
	const odd = order.find((one) => !Number.isInteger(one) || one < 1 || one > cylinders);
	if (odd !== undefined) return `there is no cylinder ${odd}`;
	return new Set(order).size < cylinders ? 'a cylinder stands twice in the order' : undefined;
}

function turned(deg: number, full: number): number {
	const rest = ((deg % full) + full) % full;
	return full - rest < 1e-9 ? 0 : rest;
}
