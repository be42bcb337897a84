/** Coarse pitch, then fine ones, by nominal diameter, mm. Source: ISO 262:1998, as public tables reprint it. */
const metric: Readonly<Record<number, readonly number[]>> = {
	3: [0.5],
	4: [0.7],
	5: [0.8],
	6: [1],
	7: [1],
	8: [1.25, 1],
	10: [1.5, 1.25, 1],
	12: [1.75, 1.5, 1.25],
	14: [2, 1.5],
	16: [2, 1.5],
	18: [2.5, 2, 1.5],
	20: [2.5, 2, 1.5],
	22: [2.5, 2, 1.5],
	24: [3, 2]
};

/** Threads per inch by nominal diameter in sixteenths of an inch. Source: ASME B1.1, UNC and UNF, from memory. */
const unified: Readonly<Record<number, { coarse: number; fine: number }>> = {
	4: { coarse: 20, fine: 28 },
	5: { coarse: 18, fine: 24 },
	6: { coarse: 16, fine: 24 },
	7: { coarse: 14, fine: 20 },
	8: { coarse: 13, fine: 20 },
	9: { coarse: 12, fine: 18 },
	10: { coarse: 11, fine: 18 },
	12: { coarse: 10, fine: 16 },
	14: { coarse: 9, fine: 14 },
	16: { coarse: 8, fine: 12 }
};

/** The coarse pitch of a metric size, mm; undefined for a size that is none of the series. */
export function coarsePitchMm(diameterMm: number): number | undefined {
	return metric[diameterMm]?.[0];
}

/** Pitches of a metric size, mm, coarse first; none for a size that is none of the series. Source: ISO 262:1998. */
export function standardPitchesMm(diameterMm: number): readonly number[] {
	return metric[diameterMm] ?? [];
}

export type UnifiedSeries = { coarse: number; fine: number };

/** Threads per inch of an inch size, coarse (UNC) and fine (UNF); undefined for other sizes. */
export function unifiedThreads(diameterIn: number): UnifiedSeries | undefined {
	const sixteenths = diameterIn * 16;
	const whole = Math.round(sixteenths);
	return Math.abs(sixteenths - whole) < 1e-6 ? unified[whole] : undefined;
}

/**
 * Whether a metric thread is of the coarse or of the fine series.
 *
 * @returns undefined where it is of neither: a thread to be looked at twice
 */
export function seriesOf(diameterMm: number, pitchMm: number): 'coarse' | 'fine' | undefined {
	const at = standardPitchesMm(diameterMm).findIndex((one) => Math.abs(one - pitchMm) < 1e-6);
	return at < 0 ? undefined : at === 0 ? 'coarse' : 'fine';
}
