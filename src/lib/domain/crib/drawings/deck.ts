/** Pistons at top dead centre against the deck, and the heights that each gasket is made for. */
export type DeckDrawing = {
	kind: 'deck';
	pistons: readonly { name: string; heightMm: number }[];
	/** The one that decides for all. */
	highest: number;
	classes: readonly { name: string; leastMm: number; mostMm: number; chosen: boolean }[];
};
