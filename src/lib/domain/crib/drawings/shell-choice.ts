/** Housing, shell and pin in section, and the clearance that each listed shell would give. */
export type ShellChoiceDrawing = {
	kind: 'shell-choice';
	housingMm: number;
	pinMm: number;
	shells: readonly { name: string; wallMm: number; clearanceMm: number }[];
	chosen?: number;
	leastMm: number;
	mostMm: number;
};
