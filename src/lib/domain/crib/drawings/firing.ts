/** One cycle drawn once around a circle: two turns of the crank for a four-stroke. */
export type FiringDrawing = {
	kind: 'firing';
	fullDeg: number;
	firings: readonly { cylinder: number; atDeg: number; toNextDeg: number }[];
	even: boolean;
};
