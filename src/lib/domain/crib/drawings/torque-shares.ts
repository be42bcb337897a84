/** Where a tightening torque goes, as shares that make one. */
export type TorqueSharesDrawing = {
	kind: 'torque-shares';
	torqueNm: number;
	shares: { pitch: number; thread: number; head: number };
};
