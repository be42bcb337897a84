/** A shaft between its thrust faces with a dial on its end. */
export type EndFloatDrawing = {
	kind: 'end-float';
	towardsMm: number;
	awayMm: number;
	floatMm: number;
};
