import type { Use } from './uses';

const kindWords: Record<Use['kind'], string> = {
	lesson: 'the lesson',
	question: 'the question',
	'job-sheet': 'the job sheet'
};

/** "the lesson Crankpins and clearances" */
export function useWords({ kind, title }: Pick<Use, 'kind' | 'title'>): string {
	return `${kindWords[kind]} ${kind === 'question' ? `“${title}”` : title}`;
}

/** For each key, who teaches from it, in words. */
export function usersByKey(uses: readonly Use[]): Map<string, string[]> {
	const found = new Map<string, string[]>();
	for (const use of uses)
		for (const key of use.sheetKeys) found.set(key, [...(found.get(key) ?? []), useWords(use)]);
	return found;
}
