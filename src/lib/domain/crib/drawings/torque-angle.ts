/** Load over angle after the snug torque, with yield and what was asked for. */
export type TorqueAngleDrawing = {
	kind: 'torque-angle';
	points: { angleDeg: number; loadN: number }[];
	yieldN: number;
	proofN: number;
	angleAtYieldDeg: number;
};
