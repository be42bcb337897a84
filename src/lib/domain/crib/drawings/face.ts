/** A face seen from above with what was read on it, and its worst line seen from the side. */
export type FaceDrawing = {
	kind: 'face';
	/** What the marked readings hold: two planes, or the thickest feeler. */
	rests: 'planes' | 'feeler';
	lengthMm: number;
	widthMm: number;
	places: {
		xMm: number;
		yMm: number;
		/** What was read there, as typed. */
		text: string;
		/** How high it lies between the lowest and the highest, 0 to 1. */
		part: number;
		/** A reading that the result rests on. */
		holds?: 'upper' | 'lower';
	}[];
	/** The stretch of the worst line, from reading to reading. */
	worst?: {
		fromMm: readonly [number, number];
		toMm: readonly [number, number];
		words: string;
	};
	/** Readings of the worst line, off the straight line through the two that hold it. */
	profile?: { atMm: readonly number[]; offMm: readonly number[]; held: readonly number[] };
	/** The result in words, for who cannot see the drawing. */
	says: string;
};
