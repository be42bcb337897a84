/** Each valve's lash before and after, on one scale, and the shim that goes in. */
export type ShimsDrawing = {
	kind: 'shims';
	valves: {
		name: string;
		beforeMm: number;
		afterMm: number;
		leastMm: number;
		mostMm: number;
		shimMm: number;
		/** "stays", "from E2", "from the box", "bought" */
		from: string;
	}[];
};
