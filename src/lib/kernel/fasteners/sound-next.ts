import { cannot, computed, type Outcome } from '../outcome';
import { alikeMm, apartMm, isRing, placedBolts, type Bolt, type Placed } from './bolt-pattern';

/**
 * The bolts that may soundly come next, where the maker prints no order: a flange is crossed in
 * pairs, each pair as far as can be from what is tight; anything else goes from the middle
 * outwards, each distance in whatever order.
 *
 * Formula: flange, largest least distance to the tight ones, then the bolt across; else least
 * distance from the middle (within 2 % of the largest counts as the same).
 * @param bolts places in mm @param done ids tightened so far, in their order
 * @returns ids, by name; none when all are tight; "cannot" where the pattern has a fault or `done` a stranger
 * Source: cross pattern of flange practice (references OR-F4 to OR-F16) and the centre-outward rule
 *   for heads (OR-H8 to OR-H14), common practice. Where the maker prints an order it wins.
 * @example soundNext(fourAround, ['1']) // ['3']: the one across
 */
export function soundNext(bolts: readonly Bolt[], done: readonly string[]): Outcome<string[]> {
	return soundBy(tighteningRule, bolts, done);
}

/**
 * The bolts that may soundly be loosened next: a flange is crossed, anything else goes from the
 * outside inwards, so that the reverse tightens soundly.
 *
 * Formula: flange, as for tightening; else largest distance from the middle (within 2 % of the
 * pattern's largest counts as the same).
 * @param bolts places in mm @param done ids loosened so far, in their order
 * @returns ids, by name; none when all are loose; "cannot" as for `soundNext`
 * Source: reverse of the centre-outward rule (reference OR07: slacken in the reverse order, ends
 *   first), common practice. Where the maker prints an order its reverse wins.
 * @example soundNextLoose(eightInTwoRows, []) // ['B1', 'B4', 'T1', 'T4']
 */
export function soundNextLoose(bolts: readonly Bolt[], done: readonly string[]): Outcome<string[]> {
	return soundBy(looseningRule, bolts, done);
}

/** Of the bolts that are left, those that may come next after the ones before. */
export type Rule = (left: readonly Placed[], before: readonly Placed[]) => Placed[];

/** What makes a next bolt of this pattern sound. */
export function tighteningRule(placed: readonly Placed[]): Rule {
	const room = alikeMm(placed);
	return isRing(placed) ? acrossTheRing : (left) => nearestTheMiddle(left, room);
}

export function looseningRule(placed: readonly Placed[]): Rule {
	const room = alikeMm(placed);
	return isRing(placed) ? acrossTheRing : (left) => farthestFromTheMiddle(left, room);
}

function soundBy(
	ruleOf: (placed: readonly Placed[]) => Rule,
	bolts: readonly Bolt[],
	done: readonly string[]
): Outcome<string[]> {
	const placed = placedBolts(bolts);
	if (!placed.ok) return placed;
	const stranger = done.find((id) => !placed.value.some((one) => one.id === id));
	if (stranger !== undefined) return cannot(`there is no bolt ${stranger}`);
	const before = done.flatMap((id) => placed.value.filter((one) => one.id === id));
	const left = placed.value.filter(({ id }) => !done.includes(id));
	return computed(ruleOf(placed.value)(left, before).map(({ id }) => id));
}

function nearestTheMiddle(left: readonly Placed[], room: number): Placed[] {
	const nearest = Math.min(...left.map((one) => one.reachMm));
	return left.filter((one) => one.reachMm <= nearest + room + 1e-9);
}

function farthestFromTheMiddle(left: readonly Placed[], room: number): Placed[] {
	const farthest = Math.max(...left.map((one) => one.reachMm));
	return left.filter((one) => one.reachMm >= farthest - room - 1e-9);
}

function acrossTheRing(left: readonly Placed[], before: readonly Placed[]): Placed[] {
	const last = before.at(-1);
	if (!last) return [...left];
	// The second of a pair lies across from the first; a new pair keeps away from all that is tight.
	const from = before.length % 2 === 1 ? [last] : before;
	const away = (one: Placed) => Math.min(...from.map((other) => apartMm(one, other)));
	const farthest = Math.max(...left.map(away));
	return left.filter((one) => away(one) >= farthest * (1 - 0.02));
}
