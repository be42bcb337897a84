/** A bolt in its joint and where the tightening torque goes, as shares that make one. */
export type TorqueSharesDrawing = {
	kind: 'torque-shares';
	torqueNm: number;
	preloadN: number;
	shares: { pitch: number; thread: number; head: number };
};
