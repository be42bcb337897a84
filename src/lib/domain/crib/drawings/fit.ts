/** An outer and an inner size as two zones on one scale, with the clearance between them. */
export type FitDrawing = {
	kind: 'fit';
	/** What runs in what, drawn beside the zones. */
	sketch: 'piston' | 'ring' | 'stem';
	outer: { words: string; leastMm: number; mostMm: number };
	inner: { words: string; leastMm: number; mostMm: number };
	/** Clearance; below zero they bind. */
	leastMm: number;
	mostMm: number;
};
