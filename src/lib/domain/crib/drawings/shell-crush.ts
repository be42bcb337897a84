/** A half shell in its half of the housing, standing proud at the split; free, wider than it. */
export type ShellCrushDrawing = {
	kind: 'shell-crush';
	housingMm: number;
	/** Of one half; below zero it stands below the split. */
	crushMm: number;
	/** The gap at the loosened joint, where it was read so. */
	gapMm?: number;
	freeWidthMm?: number;
};
