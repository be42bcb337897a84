import type { Outcome } from './outcome';

/** One entry of the register: what a formula is, who says so, and one sum that anybody can redo. */
export type Formula = {
	/** Folder and function, such as `fasteners/wrench-setting`. */
	id: string;
	/** The function that carries it. */
	works: (...given: never[]) => unknown;
	formula: string;
	source: string;
	example: {
		says: string;
		gives: () => Outcome<number> | number;
		wanted: number;
		/** Half of the last figure that `wanted` is written with. */
		within: number;
	};
};
