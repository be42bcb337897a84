/** A section as a dial reads it around one turn, drawn far larger than the section's own size. */
export type TurnDrawing = {
	kind: 'turn';
	readings: { angleDeg: number; readMm: number }[];
	meanMm: number;
	eccentricityMm: number;
	highAtDeg: number;
	runoutMm: number;
	outOfRoundMm: number;
};
