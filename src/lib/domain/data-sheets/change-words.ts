import type { Change } from './changes';

export type ChangeWords = { key: string; words: string; was: string; now: string };

/** A change as was and now, of a long entry only the parts that differ. */
export function changeWords({ key, words, what, was = '', now = '' }: Change): ChangeWords {
	if (what === 'added') return { key, words, was: 'not there', now };
	if (what === 'removed') return { key, words, was, now: 'taken out' };
	const [before, after] = [was.split('; '), now.split('; ')];
	const only = (parts: string[], others: string[]) =>
		parts.filter((one) => !others.includes(one)).join('; ') || 'nothing';
	return { key, words, was: only(before, after), now: only(after, before) };
}
