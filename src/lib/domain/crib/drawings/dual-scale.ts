/** Marks along a scale from 0 at its left to 1 at its right; only the longer ones have a figure. */
export type Marks = readonly { at: number; words?: string }[];

/** Two scales on one edge, as instruments for both trades have them, and a pointer. */
export type DualScaleDrawing = {
	kind: 'dual-scale';
	upper: { unit: string; marks: Marks; reads: string };
	lower: { unit: string; marks: Marks; reads: string };
	/** Where the pointer stands, 0 to 1. */
	pointer: number;
};
