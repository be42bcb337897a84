/** A torque wrench with its extension, seen from above. */
export type WrenchDrawing = {
	kind: 'wrench';
	lengthMm: number;
	extensionMm: number;
	angleDeg: number;
	effectiveMm: number;
};
