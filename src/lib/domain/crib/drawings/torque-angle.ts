/** Load over angle after the snug torque, with yield and the stages that were asked for. */
export type TorqueAngleDrawing = {
	kind: 'torque-angle';
	/** One line a bolt: the slippery one first, then the one that drags, where they differ. */
	lines: { angleDeg: number; loadN: number }[][];
	/** Angle turned at the end of each stage. */
	stagesDeg: number[];
	yieldN: number;
	proofN: number;
	/** Of the first line. */
	angleAtYieldDeg: number;
};
