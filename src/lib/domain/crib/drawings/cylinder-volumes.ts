type Part = 'chamber' | 'gasket' | 'deck' | 'crown' | 'crevice';

/** A cylinder at top dead centre in section, with the volumes above its piston. */
export type CylinderVolumesDrawing = {
	kind: 'cylinder-volumes';
	boreMm: number;
	strokeMm: number;
	gasketMm: number;
	gasketBoreMm: number;
	/** Piston below the deck; below zero it stands proud. */
	deckMm: number;
	ratio: number;
	parts: readonly { key: Part; words: string; cm3: number }[];
	clearanceCm3: number;
	sweptCm3: number;
};
