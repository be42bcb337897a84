/** The few ways in which an expected thing goes wrong. `http/problem.ts` gives each its status. */
export type ProblemCode =
	| 'input' // what was sent cannot be taken as it is
	| 'signed-out' // sign in first
	| 'absent' // not there, or not for this person: the two look the same
	| 'conflict' // somebody or something was there first
	| 'stale' // the sender worked from an older version
	| 'closed' // the time for it has passed
	| 'too-many' // wait before trying again
	| 'too-large'
	| 'refused' // an outside service said no
	| 'unavailable'; // an outside service did not answer

export type ProblemParameters = Record<string, string | number | Date>;
export type FieldProblems = Record<string, string[]>;

/**
 * An expected failure: a code, and an English sentence with `{placeholders}`. The sentence is
 * also the key for other languages; dates and numbers are formatted at the edge, where the
 * school's locale and time zone are known.
 */
export class Problem extends Error {
	constructor(
		readonly code: ProblemCode,
		readonly words: string,
		readonly parameters: ProblemParameters = {},
		readonly fields: FieldProblems = {},
		/** Both sides of a conflict, for the page to show. Never secrets. */
		readonly detail?: unknown
	) {
		super(words);
		this.name = 'Problem';
	}
}

export function inputProblem(fields: FieldProblems): Problem {
	return new Problem('input', 'Some of this needs another look. Each field says why.', {}, fields);
}

/** Fills the placeholders. Dates are shown as `format` says (the edge passes one per school). */
export function wordsOf(
	problem: Pick<Problem, 'words' | 'parameters'>,
	format: (value: string | number | Date) => string = (value) =>
		value instanceof Date ? value.toISOString() : String(value)
): string {
	return problem.words.replace(/\{(\w+)\}/g, (whole, name: string) => {
		const value = problem.parameters[name];
		return value === undefined ? whole : format(value);
	});
}
