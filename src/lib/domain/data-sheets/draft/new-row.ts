import type { SheetDraft } from './draft';
import type { DraftOperation } from './operation';
import type { RowSection } from './sections';
import { usualFamilies, type UsualDimension } from './usual-values';

type Add = Extract<DraftOperation, { kind: 'add' }>;

/** A new row begins with the source that was typed last: a manual is read from front to back. */
export function newRow(
	draft: SheetDraft,
	section: RowSection,
	id: string,
	values: Record<string, string> = {}
): Add {
	const source = lastSource(draft, section);
	return { kind: 'add', section, row: id, values: { ...(source ? { source } : {}), ...values } };
}

/**
 * A usual dimension, and its part family where the draft has none yet.
 * @param newId gives an id for each row that is made
 */
export function addUsual(draft: SheetDraft, dimension: UsualDimension, newId: () => string): Add[] {
	const familyKey = dimension.key.split('.')[0] ?? '';
	const { key, words, unit = 'mm', decimals } = dimension;
	const isThere = draft.rows.partFamilies.some((one) => one.values.key === familyKey);
	const family = usualFamilies.find((one) => one.key === familyKey);
	const made = newRow(draft, 'dimensions', newId(), { key, words, unit, decimals });
	if (isThere || !family) return [made];
	const values = { key: family.key, words: family.words };
	return [{ kind: 'add', section: 'partFamilies', row: newId(), values }, made];
}

/** "Big end, side clearance" in the family crankpin: `crankpin.bigEndSideClearance`. */
export function keyFromWords(words: string, family?: string): string {
	const [first = '', ...rest] = words
		.normalize('NFD')
		.replace(/\p{M}/gu, '')
		.replace(/[^A-Za-z0-9]+/g, ' ')
		.trim()
		.split(' ')
		.filter(Boolean)
		.slice(0, 5);
	const camel =
		first.toLowerCase() +
		rest.map((one) => one[0]?.toUpperCase() + one.slice(1).toLowerCase()).join('');
	const name = camel.replace(/^[^a-z]+/, '');
	return family === undefined ? name : `${family}.${name}`;
}

/** The source that was named last in this section, or of a dimension. */
export function lastSource(draft: SheetDraft, section: RowSection): string | undefined {
	if (
		section === 'partFamilies' ||
		section === 'fits' ||
		section === 'patterns' ||
		section === 'fluids'
	)
		return undefined;
	const here = draft.rows[section].findLast((one) => one.values.source?.trim());
	return (here ?? draft.rows.dimensions.findLast((one) => one.values.source?.trim()))?.values
		.source;
}
