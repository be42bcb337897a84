/** A cylinder at top dead centre in section, with the volumes above its piston. */
export type CylinderVolumesDrawing = {
	kind: 'cylinder-volumes';
	boreMm: number;
	strokeMm: number;
	sweptCm3: number;
	parts: { words: string; cm3: number }[];
};
