/**
 * External six-lobe sockets by thread, the likeliest first. Common practice; makers pair them
 * differently, and an outside drive (E) is no inside drive (T) of the same number.
 * Source: stored tool tables (references EB-M5 to EB-M16).
 */
const byThread: Readonly<Record<number, readonly string[]>> = {
	5: ['E6', 'E7'],
	6: ['E8'],
	8: ['E10', 'E12'],
	10: ['E12', 'E14'],
	12: ['E14', 'E18'],
	14: ['E18', 'E20'],
	16: ['E20', 'E24']
};

/** Across the points, mm. Source: stored tool page of external six-lobe sockets (references ES6 to ES24). */
const acrossPointsMm: Readonly<Record<string, number>> = {
	E6: 5.6,
	E7: 6.1,
	E8: 7.4,
	E14: 12.8,
	E16: 14.7,
	E18: 16.6,
	E20: 18.4,
	E24: 22.1
};

/**
 * External six-lobe sockets usually found on a thread: try the first, and never force one that rocks.
 *
 * @param diameterMm nominal diameter, mm
 * @returns socket names, likeliest first; none for a size that no table lists
 * @example sixLobeSockets(10) // ['E12', 'E14']
 */
export function sixLobeSockets(diameterMm: number): readonly string[] {
	return byThread[diameterMm] ?? [];
}

/** Nominal size of a socket across its points, mm; undefined where no table lists it. */
export function sixLobeAcrossMm(socket: string): number | undefined {
	return acrossPointsMm[socket];
}

/** Threads on which a socket is usually found, mm. */
export function threadsOfSixLobe(socket: string): number[] {
	return Object.entries(byThread)
		.filter(([, sockets]) => sockets.includes(socket))
		.map(([diameter]) => Number(diameter));
}
