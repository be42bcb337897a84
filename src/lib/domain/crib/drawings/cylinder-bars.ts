/** One bar a cylinder, with the line that it is judged by. */
export type CylinderBarsDrawing = {
	kind: 'cylinder-bars';
	unit: string;
	bars: { words: string; value: number; low: boolean }[];
	line: number;
	lineWords: string;
};
