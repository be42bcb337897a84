/** What each person read of each part, as distances from that part's mean. */
export type GroupStudyDrawing = {
	kind: 'group-study';
	people: string[];
	/** `distancesMm[person]` are that person's trials. */
	parts: { words: string; meanMm: number; distancesMm: number[][] }[];
	/** U of a reading by anybody of the group. */
	expandedMm: number;
	decimals: number;
};
