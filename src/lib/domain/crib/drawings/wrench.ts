/** A torque wrench with its extension, seen from above, to scale. */
export type WrenchDrawing = {
	kind: 'wrench';
	lengthMm: number;
	extensionMm: number;
	/** 0 straight on, 90 across, 180 back along the handle. */
	angleDeg: number;
	effectiveMm: number;
	settingNm: number;
	torqueNm: number;
};
