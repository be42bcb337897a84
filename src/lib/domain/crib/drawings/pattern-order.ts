/** A bolt pattern to scale with the place of each bolt in an order. */
export type PatternOrderDrawing = {
	kind: 'pattern-order';
	bolts: { id: string; xMm: number; yMm: number }[];
	order: string[];
};
