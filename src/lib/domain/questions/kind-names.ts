/** Names only, so that a schema can name a kind without loading every kind. */
export const kindNames = [
	'single-choice',
	'several-choices',
	'number-with-unit',
	'tightening-order',
	'ruling'
] as const;
export type KindName = (typeof kindNames)[number];

export const kindWords: Record<KindName, string> = {
	'single-choice': 'one choice',
	'several-choices': 'several choices',
	'number-with-unit': 'a number with its unit',
	'tightening-order': 'a tightening order',
	ruling: 'a ruling'
};
