/** A part between the anvils of an instrument, and how much each has grown since 20 °C. */
export type WarmDrawing = {
	kind: 'warm';
	part: { words: string; temperatureC: number; growthMm: number };
	instrument: { words: string; temperatureC: number; growthMm: number };
	readMm: number;
	at20Mm: number;
};
