import type { Loads, PropertyClass } from './proof-load';

export type Stage = { torqueNm: number } | { angleDeg: number };
export type Plan = {
	diameterMm: number;
	pitchMm: number;
	propertyClass: PropertyClass;
	/** K that brackets the lubrication: least gives the hardest pull. */
	nutFactor: { least: number; most: number };
	/** Head to first loaded thread, mm; wanted where a stage is an angle. */
	gripMm?: number;
	/** Clamped parts against the bolt; stiffer parts reach yield sooner. */
	jointPerBolt?: number;
	stages: readonly Stage[];
	/** False asks that no stage takes the slipperiest bolt past its proof load. */
	yieldTightened?: boolean;
};
export type PlannedStage = {
	stage: Stage;
	/** Preload after it, N: between the slipperiest and the driest the lubrication may be. */
	leastN: number;
	mostN: number;
	/** Whether the slipperiest bolt is past its proof load after it, and whether past yield. */
	beyondProof: boolean;
	beyondYield: boolean;
	/** Lasting stretch of that bolt, as a share of its grip. */
	lastingShare: number;
};
export type StagePlan = { loads: Loads; stages: PlannedStage[] };
