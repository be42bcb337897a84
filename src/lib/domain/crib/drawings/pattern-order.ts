/** A bolt pattern to scale with an order in its balloons, as far as the order is sound. */
export type PatternOrderDrawing = {
	kind: 'pattern-order';
	bolts: { id: string; xMm: number; yMm: number }[];
	/** Ids in their order; those that are left out have no number. */
	order: string[];
	/** The bolt of a first wrong step, and those that would have been sound there. */
	wrong?: string;
	wouldDo?: string[];
};
