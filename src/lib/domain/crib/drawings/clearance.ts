/** A journal in its bearing, the film drawn larger than it is so that it can be seen. */
export type ClearanceDrawing = {
	kind: 'clearance';
	boreMm: number;
	pinMm: number;
	leastMm: number;
	mostMm: number;
	decimals: number;
};
