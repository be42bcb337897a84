/** A cylinder in section with its piston at both dead centres; bore and stroke are to one scale. */
export type BoreAndStrokeDrawing = {
	kind: 'bore-and-stroke';
	boreMm: number;
	strokeMm: number;
	sweptCm3: number;
	cylinders: number;
};
