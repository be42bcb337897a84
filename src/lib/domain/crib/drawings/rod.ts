/** A rod with a mandrel through each end, seen from two sides, its errors drawn larger than they are. */
export type RodDrawing = {
	kind: 'rod';
	/** mm in 100 mm, its sign to which side the far end of the small end's mandrel rises. */
	bendPer100Mm: number;
	twistPer100Mm: number;
	/** Centre to centre, where it was measured. */
	lengthMm?: number;
};
