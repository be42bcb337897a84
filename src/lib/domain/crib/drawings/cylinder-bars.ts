/** One bar a cylinder, with the line that it is judged by. */
export type CylinderBarsDrawing = {
	kind: 'cylinder-bars';
	unit: string;
	decimals: number;
	bars: readonly {
		words: string;
		value: number;
		/** A second reading of the same cylinder, drawn beside the first. */
		second?: number;
		/** Beyond the line, on the side that is bad. */
		marked: boolean;
	}[];
	secondWords?: string;
	line: number;
	lineWords: string;
};
