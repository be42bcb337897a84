/** One line of an uncertainty budget. */
export type Component = {
	name: string;
	/** A: found by repeating; B: known otherwise. */
	type: 'A' | 'B';
	/** Standard uncertainty of the input, in the input's own unit, zero or more. */
	standard: number;
	/** How far the result moves for one unit of the input. */
	sensitivity: number;
	/** Infinity where the figure is taken as known for certain. */
	degreesOfFreedom: number;
};

/** Correlation of two components by their places in the list, −1 to 1. */
export type Correlation = { first: number; second: number; coefficient: number };

/** Whether each figure of a component can be one. */
export function isComponent({ standard, sensitivity, degreesOfFreedom }: Component): boolean {
	return (
		standard >= 0 &&
		Number.isFinite(standard) &&
		Number.isFinite(sensitivity) &&
		degreesOfFreedom > 0
	);
}
