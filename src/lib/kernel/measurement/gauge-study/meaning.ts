import { computed, type Outcome } from '../../outcome';
import { coverageFactor } from '../uncertainty';
import { percentOfTolerance, type StudyFigures } from './figures';

export type StudyVerdict = 'fit' | 'may-do' | 'unfit';
export type StudyMeaning = {
	verdict: StudyVerdict;
	/** U = 2 GRR: the guard band of a reading by anybody of the group. */
	expanded: number;
	/** How far two people's readings of one part may lie apart, 95 times in 100. */
	apart: number;
	/** Which of the two counts most, and so what to mend. */
	mend: 'tool' | 'people';
	percentOfTolerance: number | undefined;
};

/**
 * What a study says for a ruling: how far apart two of the group may read one part, how wide the
 * guard band of anybody's reading is, and what to mend first.
 *
 * Formula: apart = 1.96 · √2 · GRR; U = 2 · GRR; fit below 10 %, may do to 30 %, of the limits'
 * width where there is one, else of the study's variation.
 * @param figures of a study @param width most − least of the limits, where there are two
 * @returns in the readings' unit
 * Source: ISO 5725-6:1994, 4.1.4 (critical difference 2.8 σ); AIAG, Measurement Systems Analysis
 * (2010), chapter II section D (10 and 30 %).
 * @example studyMeaning(figures, 6) // GRR 0.3024: apart 0.838, U 0.605, unfit (30.2 %)
 */
export function studyMeaning(figures: StudyFigures, width?: number): Outcome<StudyMeaning> {
	const { gauge, repeatability, reproducibility, percent } = figures;
	const ofWidth = width === undefined ? undefined : percentOfTolerance(gauge, width);
	if (ofWidth && !ofWidth.ok) return ofWidth;
	const share = ofWidth?.value ?? percent.gauge;
	return computed({
		verdict: share < 10 ? 'fit' : share <= 30 ? 'may-do' : 'unfit',
		expanded: coverageFactor * gauge,
		apart: 1.96 * Math.SQRT2 * gauge,
		mend: repeatability >= reproducibility ? 'tool' : 'people',
		percentOfTolerance: ofWidth?.value
	});
}
