import type { Stamp } from './read-draft';

/** "A" after none, "D" after "C", "AA" after "Z"; undefined after "ZZ", where the letters end. */
export function nextRevision(standing: string | undefined): string | undefined {
	if (standing === undefined) return 'A';
	const number = [...standing].reduce((sum, one) => sum * 26 + one.charCodeAt(0) - 64, 0) + 1;
	if (number > 26 * 27) return undefined;
	const letter = (at: number) => String.fromCharCode(64 + at);
	return number <= 26
		? letter(number)
		: letter(Math.floor((number - 1) / 26)) + letter(((number - 1) % 26) + 1);
}

/** What the server sets when a sheet is published: its next revision, and the day in the school. */
export function stampFor(
	key: string,
	standing: string | undefined,
	at: Date,
	timeZone: string
): Stamp {
	const day = new Intl.DateTimeFormat('en-CA', {
		year: 'numeric',
		month: '2-digit',
		day: '2-digit',
		timeZone
	}).format(at);
	return { key, revision: nextRevision(standing) ?? '', issuedOn: day };
}
