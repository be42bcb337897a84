import { cannot, computed, type Outcome } from '../outcome';
import { placedBolts, type Bolt } from './bolt-pattern';
import { soundNextLoose, soundNext } from './sound-next';

export type Departure = { step: number; was: string; wanted: string };
export type SoundDeparture = { step: number; was: string; sound: string[] };
export type Direction = 'tighten' | 'loosen';

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

/**
 * The first step at which an order leaves every sound one, where the maker prints none: several
 * are sound, mirror images among them, and the order is held to the one that it follows longest.
 *
 * @param bolts places in mm @param given ids in the student's order
 * @param direction a loosening order goes from the outside inwards, a flange is crossed
 * @returns step counted from 1 in the order given, with the bolts that would have been sound there;
 *   null for a sound order; "cannot" where a bolt is missing, unknown or named twice
 * @example departureFromSound(eightInTwoRows, ['T1', …]) // { step: 1, was: 'T1', sound: ['B2', 'B3', 'T2', 'T3'] }
 */
export function departureFromSound(
	bolts: readonly Bolt[],
	given: readonly string[],
	direction: Direction = 'tighten'
): Outcome<SoundDeparture | null> {
	const ids = bolts.map(({ id }) => id);
	const fault = incomplete(ids, given);
	return fault ? cannot(fault) : leavesAt(bolts, given, direction);
}

/**
 * How many steps of an order, from its first on, some sound order shares; the order may be
 * unfinished.
 *
 * @param bolts, given, direction as in `departureFromSound`
 * @returns zero up to all of them; a bolt that is unknown or named again ends the count
 * @example soundSteps(eightInTwoRows, ['T2', 'B3', 'T1']) // 2
 */
export function soundSteps(
	bolts: readonly Bolt[],
	given: readonly string[],
	direction: Direction = 'tighten'
): Outcome<number> {
	const left = leavesAt(bolts, given, direction);
	if (!left.ok) return left;
	return computed(left.value ? left.value.step - 1 : given.length);
}

function leavesAt(
	bolts: readonly Bolt[],
	given: readonly string[],
	direction: Direction
): Outcome<SoundDeparture | null> {
	const placed = placedBolts(bolts);
	if (!placed.ok) return placed;
	for (const [at, was] of given.entries()) {
		const done = given.slice(0, at);
		const sound = direction === 'loosen' ? soundNextLoose(bolts, done) : soundNext(bolts, done);
		if (!sound.ok) return sound;
		if (!sound.value.includes(was)) return computed({ step: at + 1, was, sound: sound.value });
	}
	return computed(null);
}

function incomplete(wanted: readonly string[], given: readonly string[]): string | undefined {
	if (new Set(given).size < given.length) return 'a bolt is named twice';
	const stranger = given.find((id) => !wanted.includes(id));
	if (stranger !== undefined) return `there is no bolt ${stranger}`;
	const missing = wanted.length - given.length;
	if (missing > 0) return missing === 1 ? '1 bolt is missing' : `${missing} bolts are missing`;
	return undefined;
}
