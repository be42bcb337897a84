import { computed, type Outcome } from '../../outcome';
import { crossedTable, pooledTable, type AnovaTable } from './anova-table';
import { studyFigures, type StudyFigures } from './figures';
import { balanced, type GaugeStudy } from './study';

export type VarianceComponents = Record<
	'repeatability' | 'person' | 'interaction' | 'part',
	number
>;
export type AnovaStudy = {
	/** With the interaction; and without, which is what counts where `pooled` is true. */
	crossed: AnovaTable;
	table: AnovaTable;
	pooled: boolean;
	/** As they come out, and with nothing below zero. */
	unclipped: VarianceComponents;
	variance: VarianceComponents;
	figures: StudyFigures;
};

/** Above this probability an interaction is taken to be chance and pooled with the scatter. */
export const usualPooling = 0.25;

/**
 * Repeatability and reproducibility by analysis of variance; it also sees where people differ on
 * some parts only (interaction).
 *
 * Formula: σ²repeat = MS_e; σ²inter = (MS_pi − MS_e) / r; σ²person = (MS_o − MS_pi) / (n r);
 * σ²part = (MS_p − MS_pi) / (k r); with the interaction pooled MS_pi = MS_e of the pool; nothing
 * below zero; reproducibility² = σ²person + σ²inter; n parts, k people, r trials.
 * @param study readings[person][trial][part], everybody equally often, two or more of each
 * @param interaction 'pool-when-chance' (p above 0.25), 'pool' or 'keep'
 * @returns in the readings' unit; "cannot" where the study is not balanced or shows no scatter
 * Source: AIAG, Measurement Systems Analysis (2010), chapter III section B and appendix A; the
 * bound of 0.25 is the cautious one of the usual 0.05 to 0.25.
 * @example studyByAnova([[[2.0, 2.4], [2.1, 2.5]], [[2.0, 2.4], [2.0, 2.5]]], 'keep') // EV 0.061
 */
export function studyByAnova(
	study: GaugeStudy,
	interaction: 'pool-when-chance' | 'pool' | 'keep' = 'pool-when-chance'
): Outcome<AnovaStudy> {
	const size = balanced(study);
	if (!size.ok) return size;
	const { people, trials, parts } = size.value;
	const crossed = crossedTable(study, size.value);
	const chance = (crossed.interaction?.p ?? 0) > usualPooling;
	const pooled = interaction === 'pool' || (interaction === 'pool-when-chance' && chance);
	const table = pooled ? pooledTable(crossed) : crossed;
	const error = table.residual.meanSquare;
	const cross = table.interaction?.meanSquare ?? error;
	const unclipped: VarianceComponents = {
		repeatability: error,
		interaction: (cross - error) / trials,
		person: (table.person.meanSquare - cross) / (parts * trials),
		part: (table.part.meanSquare - cross) / (people * trials)
	};
	const variance: VarianceComponents = {
		repeatability: error,
		interaction: Math.max(0, unclipped.interaction),
		person: Math.max(0, unclipped.person),
		part: Math.max(0, unclipped.part)
	};
	const figures = studyFigures(
		Math.sqrt(error),
		Math.sqrt(variance.person + variance.interaction),
		Math.sqrt(variance.part)
	);
	return figures.ok
		? computed({ crossed, table, pooled, unclipped, variance, figures: figures.value })
		: figures;
}
