/** An uncertainty budget: what each part adds, and the readings with the result on one axis. */
export type BudgetDrawing = {
	kind: 'budget';
	parts: { words: string; contributionMm: number; share: number }[];
	standardMm: number;
	readingsMm: readonly number[];
	valueMm: number;
	expandedMm: number;
	decimals: number;
};
