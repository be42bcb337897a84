import { kindOf } from '../questions/registry';
import type { Question } from '../questions/schema';
import { figuresOf } from './figures';
import type { DataSheet } from './schema';
import type { Use } from './uses';
import { keysOf } from './value-of';

type Keyed = { key: string };
export type Touched<Change extends Keyed> = Use & { changes: Change[] };

/** What is taught from values that change, each with its own changes. */
export function touchedBy<Change extends Keyed>(
	changes: readonly Change[],
	uses: readonly Use[]
): Touched<Change>[] {
	return uses.flatMap((use) => {
		const own = changes.filter((one) => use.sheetKeys.includes(one.key));
		return own.length > 0 ? [{ ...use, changes: own }] : [];
	});
}

/** Keys that something is taught from and the sheet has not: nothing may be published without them. */
export function keysMissed(sheet: DataSheet, uses: readonly Use[]): { key: string; uses: Use[] }[] {
	const held = keysOf(sheet);
	const wanted = new Set(uses.flatMap((one) => one.sheetKeys).filter((key) => !held.has(key)));
	return [...wanted].map((key) => ({
		key,
		uses: uses.filter((one) => one.sheetKeys.includes(key))
	}));
}

const tries = 12;

/**
 * Questions that the new sheet would leave without an answer, though the old one gave one: a
 * value is still there but has lost the limit that is asked for. Seen by drawing each a few times.
 */
export function questionsLost(
	questions: readonly Question[],
	before: DataSheet | undefined,
	after: DataSheet
): { key: string; because: string }[] {
	return questions.flatMap((question) => {
		const because = fault(question, after);
		const wasSound = before === undefined || fault(question, before) === undefined;
		return because !== undefined && wasSound ? [{ key: question.key, because }] : [];
	});
}

function fault({ kind, body }: Question, sheet: DataSheet): string | undefined {
	const figures = figuresOf(sheet);
	for (let seed = 1; seed <= tries; seed++) {
		const drawn = kindOf(kind).draw(body, `publishing/${seed}`, figures);
		if (!drawn.ok) return drawn.because;
	}
	return undefined;
}
