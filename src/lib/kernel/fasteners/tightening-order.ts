import { computed, type Outcome } from '../outcome';
import { apartMm, isRing, placedBolts, type Bolt, type Placed } from './bolt-pattern';
import { departureFromSound } from './departure';
import { looseningRule, tighteningRule, type Rule } from './sound-next';

export type { Bolt };

/**
 * One sound order for a pattern for which the maker prints none.
 *
 * Formula: of the sound next bolts the one farthest from the pair tightened last, then by name.
 * @param bolts places in mm
 * @returns bolt ids, tightened first to last; the same whatever order they were given in
 * Source: as `soundNext`. Where the maker prints an order it wins.
 * @example orderFromMiddle(eightAround) // 1, 5, 3, 7, 2, 6, 4, 8
 */
export function orderFromMiddle(bolts: readonly Bolt[]): Outcome<string[]> {
	return stepByStep(bolts, tighteningRule);
}

/**
 * One sound order of loosening for a pattern for which the maker prints none: the reverse of
 * `orderFromMiddle`, and a flange whose reverse would take neighbours first is crossed instead.
 *
 * Formula: of the bolts that may soundly be loosened next the one farthest from the pair loosened
 * last, then by name, where the reverse of the tightening order is not sound itself.
 * @param bolts places in mm
 * @returns bolt ids, loosened first to last
 * Source: reference OR07, slacken in the reverse order, ends first; common practice.
 * @example orderFromOutside(eightInTwoRows) // begins with a corner
 */
export function orderFromOutside(bolts: readonly Bolt[]): Outcome<string[]> {
	const tighten = orderFromMiddle(bolts);
	if (!tighten.ok) return tighten;
	const reverse = loosening(tighten.value);
	const left = departureFromSound(bolts, reverse, 'loosen');
	if (!left.ok) return left;
	return left.value ? stepByStep(bolts, looseningRule) : computed(reverse);
}

/** The reverse: what was tightened last is loosened first. */
export function loosening(tightening: readonly string[]): string[] {
	return [...tightening].reverse();
}

function stepByStep(
	bolts: readonly Bolt[],
	ruleOf: (placed: readonly Placed[]) => Rule
): Outcome<string[]> {
	const placed = placedBolts(bolts);
	if (!placed.ok) return placed;
	const rule = ruleOf(placed.value);
	const inPairs = isRing(placed.value);
	let left = placed.value;
	const out: Placed[] = [];
	while (left.length > 0) {
		const lately = out.slice(inPairs && out.length % 2 === 0 ? -2 : -1);
		const away = (one: Placed) => Math.min(Infinity, ...lately.map((other) => apartMm(one, other)));
		const next = rule(left, out).reduce((best, one) =>
			away(one) > away(best) * 1.000001 ? one : best
		);
		out.push(next);
		left = left.filter((one) => one !== next);
	}
	return computed(out.map((one) => one.id));
}
