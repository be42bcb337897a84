import type { ToolVerdict } from '$lib/kernel/measurement/tool';

/** The limits, and for each tool the zones about them in which it cannot decide. */
export type ToolZonesDrawing = {
	kind: 'tool-zones';
	from: number;
	to: number;
	least?: number;
	most?: number;
	tools: {
		words: string;
		verdict: ToolVerdict;
		fetch: boolean;
		zones: { from: number; to: number }[];
	}[];
	decimals: number;
};
