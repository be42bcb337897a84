import { seeded } from '$lib/kernel/random/random';

/** What the browser sees of an option. */
export type FaceOption = { id: string; text: string };

/**
 * Shuffles options for one sitting. An id is the place on the page (a, b, c): it means something
 * else in every sitting and carries no number out of the generator that the order came from.
 */
export function drawOptions<T>(options: readonly T[], seed: string): (T & { id: string })[] {
	return seeded(`${seed}/options`)
		.shuffle(options)
		.map((option, place) => ({ ...option, id: letter(place) }));
}

export function letter(place: number): string {
	return String.fromCharCode('a'.charCodeAt(0) + place);
}

export function faceOptions(options: readonly FaceOption[]): FaceOption[] {
	return options.map(({ id, text }) => ({ id, text }));
}

export function textsOf(options: readonly FaceOption[], ids: readonly string[]): string {
	const chosen = options.filter((one) => ids.includes(one.id)).map((one) => one.text);
	return chosen.length > 0 ? chosen.join('; ') : 'nothing chosen';
}
