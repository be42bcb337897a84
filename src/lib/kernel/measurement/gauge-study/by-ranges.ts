import { computed, type Outcome } from '../../outcome';
import { meanRangeDivisor, rangeConstants } from '../range-constants';
import { studyFigures, type StudyFigures } from './figures';
import { balanced, mean, partMeans, spread, type GaugeStudy } from './study';

/** Factors that make deviations out of ranges, and the one for the largest range to expect. */
export type RangeFactors = { k1: number; k2: number; k3: number; d4: number };
export type RangeStudy = {
	factors: RangeFactors;
	personMeans: number[];
	personMeanRanges: number[];
	meanRange: number;
	/** Largest less smallest of the people's means, and of the parts'. */
	meanDifference: number;
	partRange: number;
	grandMean: number;
	partMeans: number[];
	rangeLimit: number;
	/** Repeats that differ by more than is to be expected: look at them again. */
	overLimit: { person: number; part: number; range: number }[];
	figures: StudyFigures;
};

/**
 * Repeatability and reproducibility by averages and ranges: the sums that a sheet of paper holds.
 *
 * Formula: EV = R̄ · K1; AV² = (X̄diff · K2)² − EV² / (n r), nothing below zero; PV = Rp · K3;
 * K1 = 1 / d2(r), K2 = 1 / d2*(people), K3 = 1 / d2*(n); limit of a range D4 · R̄,
 * D4 = 1 + 3 d3 / d2; n parts, r trials.
 * @param study readings[person][trial][part], everybody equally often, two or more of each
 * @param factors those of a printed table, where its rounding is wanted
 * @returns in the readings' unit; "cannot" where the study is not balanced or shows no scatter
 * Source: AIAG, Measurement Systems Analysis (2010), chapter III section B.
 * @example studyByRanges([[[2.0, 2.4], [2.1, 2.5]], [[2.0, 2.4], [2.0, 2.5]]]) // EV 0.067
 */
export function studyByRanges(study: GaugeStudy, factors?: RangeFactors): Outcome<RangeStudy> {
	const size = balanced(study);
	if (!size.ok) return size;
	const { people, trials, parts, all } = size.value;
	const { k1, k2, k3, d4 } = factors ?? exactFactors(people, trials, parts);
	const ranges = study.map((one) =>
		(one[0] ?? []).map((_, part) => spread(one.map((trial) => trial[part] as number)))
	);
	const personMeans = study.map((one) => mean(one.flat()));
	const personMeanRanges = ranges.map(mean);
	const meanRange = mean(personMeanRanges);
	const means = partMeans(study);
	const [meanDifference, partRange] = [spread(personMeans), spread(means)];
	const repeatability = meanRange * k1;
	const between = (meanDifference * k2) ** 2 - repeatability ** 2 / (parts * trials);
	const figures = studyFigures(repeatability, Math.sqrt(Math.max(0, between)), partRange * k3);
	if (!figures.ok) return figures;
	const rangeLimit = d4 * meanRange;
	return computed({
		factors: { k1, k2, k3, d4 },
		personMeans,
		personMeanRanges,
		meanRange,
		meanDifference,
		partRange,
		grandMean: mean(all),
		partMeans: means,
		rangeLimit,
		overLimit: ranges.flatMap((one, person) =>
			one.flatMap((range, part) => (range > rangeLimit ? [{ person, part, range }] : []))
		),
		figures: figures.value
	});
}

function exactFactors(people: number, trials: number, parts: number): RangeFactors {
	const { d2, d3 } = rangeConstants(trials);
	return {
		k1: 1 / d2,
		k2: 1 / meanRangeDivisor(people, 1),
		k3: 1 / meanRangeDivisor(parts, 1),
		d4: 1 + (3 * d3) / d2
	};
}
