import type { Bolt } from '$lib/kernel/fasteners/bolt-pattern';
import {
	departureFromSound,
	firstWrongStep,
	soundSteps,
	type Direction
} from '$lib/kernel/fasteners/departure';
import { soundNext, soundNextLoose } from '$lib/kernel/fasteners/sound-next';
import { computed, type Outcome } from '$lib/kernel/outcome';

export type Judged = {
	/** "sound from the first bolt to the last" */
	says: string;
	/** How many of its steps hold, from the first on. */
	held: number;
	/** The bolt of the first wrong step, and those that would do there. */
	wrong?: string;
	wouldDo?: string[];
};

/** Somebody's own order, also while it is unfinished: how far it holds and what comes there. */
export function judgedOrder(
	bolts: readonly Bolt[],
	mine: readonly string[],
	direction: Direction,
	printed?: readonly string[]
): Outcome<Judged> {
	const leaves = printed
		? firstWrongStep(printed, mine)
		: departureFromSound(bolts, mine, direction);
	if (!leaves.ok) return unfinished(bolts, mine, direction, leaves.because, printed);
	if (!leaves.value)
		return computed({
			says: printed
				? 'as it is printed, from the first bolt to the last'
				: 'sound, from the first bolt to the last',
			held: mine.length
		});
	const { step, was } = leaves.value;
	const wouldDo = 'sound' in leaves.value ? leaves.value.sound : [leaves.value.wanted];
	const there = oneOf(wouldDo);
	return computed({
		says: printed
			? `wrong at step ${step}: ${was}, where ${there} comes`
			: `leaves every sound order at step ${step}: ${was}, where ${there} would do`,
		held: step - 1,
		wrong: was,
		wouldDo
	});
}

/** An order with a bolt too few, too many, unknown or twice is held as far as it goes. */
function unfinished(
	bolts: readonly Bolt[],
	mine: readonly string[],
	direction: Direction,
	because: string,
	printed?: readonly string[]
): Outcome<Judged> {
	const known = mine.findIndex(
		(id, at) => mine.indexOf(id) < at || !bolts.some((one) => one.id === id)
	);
	const clean = known < 0 ? mine : mine.slice(0, known);
	const held = printed
		? computed(countWhile(clean, (id, at) => printed[at] === id))
		: soundSteps(bolts, clean, direction);
	if (!held.ok) return held;
	const left = clean[held.value];
	const comes = printed
		? computed(printed.slice(held.value, held.value + 1))
		: (direction === 'loosen' ? soundNextLoose : soundNext)(bolts, clean.slice(0, held.value));
	if (!comes.ok) return comes;
	return computed({
		says:
			left === undefined
				? `${printed ? 'as printed' : 'sound'} as far as it goes, ${held.value} ${held.value === 1 ? 'step' : 'steps'}; then ${because}`
				: `wrong at step ${held.value + 1}: ${left}, where ${oneOf(comes.value)} ${printed ? 'comes' : 'would do'}; and ${because}`,
		held: held.value,
		...(left === undefined ? {} : { wrong: left, wouldDo: comes.value })
	});
}

function countWhile<T>(these: readonly T[], holds: (one: T, at: number) => boolean): number {
	const at = these.findIndex((one, index) => !holds(one, index));
	return at < 0 ? these.length : at;
}

function oneOf(ids: readonly string[]): string {
	return ids.length > 1 ? `${ids.slice(0, -1).join(', ')} or ${ids.at(-1) ?? ''}` : (ids[0] ?? '');
}
