/** How far a bolt is loaded, on a bar from nothing to its least tensile load. */
export type BoltLoadDrawing = {
	kind: 'bolt-load';
	/** Least and most that it may be loaded with, N; one figure where nothing scatters. */
	leastN: number;
	mostN: number;
	proofN: number;
	yieldN: number;
	tensileN: number;
};
