/** A ring in its bore seen from above: the gap where it was measured, and where the bore is widest. */
export type RingGapDrawing = {
	kind: 'ring-gap';
	gapMm: number;
	boreMm?: number;
	widest?: { gapMm: number; boreMm: number };
};
