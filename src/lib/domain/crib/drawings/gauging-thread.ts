/** A gauging thread pressed flat along a pin, with the clearance read at each place. */
export type GaugingThreadDrawing = {
	kind: 'gauging-thread';
	places: readonly { clearanceMm: number; widthMm?: number }[];
	leastMm: number;
	mostMm: number;
};
