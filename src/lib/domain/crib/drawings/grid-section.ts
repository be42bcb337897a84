/** A bore or a journal in section with the readings where they were taken. */
export type GridSectionDrawing = {
	kind: 'grid-section';
	part: 'bore' | 'journal';
	/** Rows are depths, columns planes, mm. */
	rows: readonly (readonly number[])[];
	leastMm: number;
	mostMm: number;
	worst: { depth: number; plane: number };
	/** The size that it is machined to next, mm. */
	nextMm?: number;
};
