/**
 * A cylinder with liquid above its piston, to one scale. The chamber is drawn as a flat space of
 * the same volume, so that heights stand for volumes.
 */
export type LiquidLockDrawing = {
	kind: 'liquid-lock';
	boreMm: number;
	strokeMm: number;
	/** The clearance volume and the liquid as heights over the piston. */
	clearanceMm: number;
	liquidMm: number;
	/** Where the piston stands: stopped, or at top dead centre. */
	belowMm: number;
	locks: boolean;
	liquidCm3: number;
	rodMm?: number;
	crankDeg?: number;
};
