/** A stage plan as rounds of the pattern, each bolt a box to tick. */
export type StageRoundsDrawing = {
	kind: 'stage-rounds';
	rounds: StageRound[];
};

export type StageRound = {
	/** "Stage 2: to 40 N·m" */
	words: string;
	does: { torqueNm: number } | { angleDeg: number } | 'slacken';
	/** In the order in which the hand takes them. */
	bolts: string[];
};
