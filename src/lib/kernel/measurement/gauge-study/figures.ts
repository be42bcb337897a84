import { cannot, computed, type Outcome } from '../../outcome';

/** Where the variation of a study comes from, each as a standard deviation in the readings' unit. */
export type StudyFigures = {
	/** One person reading one part again: repeatability, equipment variation. */
	repeatability: number;
	/** Between people: reproducibility, appraiser variation. */
	reproducibility: number;
	/** Both together. */
	gauge: number;
	/** Between parts. */
	parts: number;
	total: number;
	/** Each as a percentage of the total deviation (study variation). */
	percent: Record<'repeatability' | 'reproducibility' | 'gauge' | 'parts', number>;
	/** How many sorts of part the group can tell apart, and the same before it is cut. */
	categories: number;
	categoriesRaw: number;
};

/**
 * Figures of a study from its three deviations.
 *
 * Formula: GRR² = EV² + AV²; TV² = GRR² + PV²; % = 100 · each / TV; categories = ⌊1.41 PV / GRR⌋.
 * @param repeatability EV @param reproducibility AV @param parts PV, each zero or more
 * @returns "cannot" where nobody's readings differ, since then the tool hides its own scatter
 * Source: AIAG, Measurement Systems Analysis (2010), chapter III section B.
 * @example studyFigures(0.2019, 0.2297, 1.1046) // gauge 0.3058, 26.7 %, 5 categories
 */
export function studyFigures(
	repeatability: number,
	reproducibility: number,
	parts: number
): Outcome<StudyFigures> {
	const gauge = Math.hypot(repeatability, reproducibility);
	const total = Math.hypot(gauge, parts);
	if (![repeatability, reproducibility, parts].every((one) => one >= 0 && Number.isFinite(one)))
		return cannot('a deviation is a number, zero or more');
	if (gauge === 0)
		return cannot('nobody’s readings differ: read to a finer step, or the tool hides its scatter');
	const of = (one: number) => (100 * one) / total;
	const categoriesRaw = (1.41 * parts) / gauge;
	return computed({
		repeatability,
		reproducibility,
		gauge,
		parts,
		total,
		percent: {
			repeatability: of(repeatability),
			reproducibility: of(reproducibility),
			gauge: of(gauge),
			parts: of(parts)
		},
		categories: Math.floor(categoriesRaw),
		categoriesRaw
	});
}

/**
 * How much of the limits' width the group's own scatter takes.
 *
 * Formula: 100 · 6 · GRR / (most − least).
 * @param gauge GRR, standard deviation @param width most − least, above zero
 * @returns per cent; "cannot" without a width
 * Source: AIAG, Measurement Systems Analysis (2010), chapter III section B (six deviations).
 * @example percentOfTolerance(0.3024, 6) // 30.24
 */
export function percentOfTolerance(gauge: number, width: number): Outcome<number> {
	if (!(width > 0) || !Number.isFinite(width))
		return cannot('the limits have no width: the least lies on the most, or above it');
	if (!(gauge >= 0) || !Number.isFinite(gauge))
		return cannot('a deviation is a number, zero or more');
	const percent = (100 * 6 * gauge) / width;
	return Number.isFinite(percent)
		? computed(percent)
		: cannot('the limits have no width to speak of');
}
