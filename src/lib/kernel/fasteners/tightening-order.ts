import { cannot, computed, type Outcome } from '../outcome';
import { alikeMm, apartMm, isRing, placedBolts, type Bolt, type Placed } from './bolt-pattern';

export type { Bolt };

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
	const placed = placedBolts(bolts);
	if (!placed.ok) return placed;
	const tight = done.map((id) => placed.value.find((one) => one.id === id));
	if (tight.some((one) => !one)) return cannot('there is no such bolt');
	const left = placed.value.filter(({ id }) => !done.includes(id));
	const sound = isRing(placed.value)
		? acrossTheRing(left, tight as Placed[])
		: nearestTheMiddle(left, alikeMm(placed.value));
	return computed(sound.map(({ id }) => id));
}

function nearestTheMiddle(left: readonly Placed[], room: number): Placed[] {
	const nearest = Math.min(...left.map((one) => one.reachMm));
	return left.filter((one) => one.reachMm <= nearest + room + 1e-9);
}

function acrossTheRing(left: readonly Placed[], tight: readonly Placed[]): Placed[] {
	const last = tight.at(-1);
	if (!last) return [...left];
	// The second of a pair lies across from the first; a new pair keeps away from all that is tight.
	const from = tight.length % 2 === 1 ? [last] : tight;
	const away = (one: Placed) => Math.min(...from.map((other) => apartMm(one, other)));
	const farthest = Math.max(...left.map(away));
	return left.filter((one) => away(one) >= farthest * (1 - 0.02));
}

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
	const placed = placedBolts(bolts);
	if (!placed.ok) return placed;
	const ring = isRing(placed.value);
	const room = alikeMm(placed.value);
	let left = placed.value;
	const out: Placed[] = [];
	while (left.length > 0) {
		const sound = ring ? acrossTheRing(left, out) : nearestTheMiddle(left, room);
		const lately = out.slice(ring && out.length % 2 === 0 ? -2 : -1);
		const away = (one: Placed) => Math.min(Infinity, ...lately.map((other) => apartMm(one, other)));
		const next = sound.reduce((best, one) => (away(one) > away(best) * 1.000001 ? one : best));
		out.push(next);
		left = left.filter((one) => one !== next);
	}
	return computed(out.map((one) => one.id));
}

/** The reverse: what was tightened last is loosened first. */
export function loosening(tightening: readonly string[]): string[] {
	return [...tightening].reverse();
}

export type Departure = { step: number; was: string; wanted: string };

/**
 * The first step at which an order departs from a printed one, or none. A mirror image of the
 * printed order is a departure: the printed order wins over every rule.
 *
 * @param wanted ids in the printed order @param given ids in the student's
 * @returns step counted from 1; "cannot" where a bolt is missing, unknown or named twice
 * @example firstWrongStep(['a', 'b', 'c'], ['a', 'c', 'b']) // { step: 2, was: 'c', wanted: 'b' }
 */
export function firstWrongStep(
	wanted: readonly string[],
	given: readonly string[]
): Outcome<Departure | null> {
	const fault = incomplete(wanted, given);
	if (fault) return cannot(fault);
	const at = wanted.findIndex((id, step) => given[step] !== id);
	if (at < 0) return computed(null);
	return computed({ step: at + 1, was: given[at] ?? '', wanted: wanted[at] ?? '' });
}

export type SoundDeparture = { step: number; was: string; sound: string[] };

/**
 * The first step at which an order leaves every sound one, where the maker prints none: several
 * are sound, mirror images among them.
 *
 * @param bolts places in mm @param given ids in the student's order
 * @param direction a loosening order is sound when its reverse tightens soundly
 * @returns step counted from 1 in the order given, with the bolts that would have been sound there;
 *   null for a sound order; "cannot" where a bolt is missing, unknown or named twice
 * @example departureFromSound(eightInTwoRows, ['T1', …]) // { step: 1, was: 'T1', sound: ['B2', 'B3', 'T2', 'T3'] }
 */
export function departureFromSound(
	bolts: readonly Bolt[],
	given: readonly string[],
	direction: 'tighten' | 'loosen' = 'tighten'
): Outcome<SoundDeparture | null> {
	const fault = incomplete(
		bolts.map(({ id }) => id),
		given
	);
	if (fault) return cannot(fault);
	if (direction === 'loosen') return departureLoosening(bolts, given);
	for (const [at, was] of given.entries()) {
		const sound = soundNext(bolts, given.slice(0, at));
		if (!sound.ok) return sound;
		if (!sound.value.includes(was)) return computed({ step: at + 1, was, sound: sound.value });
	}
	return computed(null);
}

/** Loosened from the outside inwards: at each step a bolt that lies farthest from the middle of those still tight. */
function departureLoosening(
	bolts: readonly Bolt[],
	given: readonly string[]
): Outcome<SoundDeparture | null> {
	const placed = placedBolts(bolts);
	if (!placed.ok) return placed;
	if (isRing(placed.value)) return departureFromSound(bolts, given);
	const room = alikeMm(placed.value);
	for (const [at, was] of given.entries()) {
		const tight = placed.value.filter(({ id }) => !given.slice(0, at).includes(id));
		const farthest = Math.max(...tight.map((one) => one.reachMm));
		const sound = tight.filter((one) => one.reachMm >= farthest - room - 1e-9).map(({ id }) => id);
		if (!sound.includes(was)) return computed({ step: at + 1, was, sound });
	}
	return computed(null);
}

function incomplete(wanted: readonly string[], given: readonly string[]): string | undefined {
	if (new Set(given).size < given.length) return 'a bolt is named twice';
	if (given.some((id) => !wanted.includes(id))) return 'there is no such bolt';
	const missing = wanted.length - given.length;
	if (missing > 0) return missing === 1 ? '1 bolt is missing' : `${missing} bolts are missing`;
	return undefined;
}
