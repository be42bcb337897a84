import { fUpperTail } from '../../statistics/distributions/f';
import { mean, partMeans, type Balanced, type GaugeStudy } from './study';

export type AnovaRow = {
	df: number;
	sumOfSquares: number;
	meanSquare: number;
	/** Against the residual, and against the interaction (parts and people as drawn by chance). */
	f?: number;
	p?: number;
	againstInteraction?: { f: number; p: number };
};
export type AnovaTable = {
	part: AnovaRow;
	person: AnovaRow;
	/** Missing once it is pooled with the residual. */
	interaction?: AnovaRow;
	residual: AnovaRow;
};

/** Sums of squares of a balanced study of parts by people, with their interaction. */
export function crossedTable(
	study: GaugeStudy,
	{ people, trials, parts, all }: Balanced
): AnovaTable {
	const grand = mean(all);
	const square = (values: readonly number[], about: number) =>
		values.reduce((sum, one) => sum + (one - about) ** 2, 0);
	const byPart = partMeans(study);
	const byPerson = study.map((one) => mean(one.flat()));
	let [cross, left] = [0, 0];
	study.forEach((one, person) =>
		byPart.forEach((partMean, part) => {
			const repeats = one.map((trial) => trial[part] as number);
			const cell = mean(repeats);
			cross += (cell - partMean - (byPerson[person] as number) + grand) ** 2;
			left += square(repeats, cell);
		})
	);
	const residual = row(left, people * parts * (trials - 1));
	const interaction = tested(row(trials * cross, (people - 1) * (parts - 1)), residual);
	const main = (sum: number, df: number) => {
		const { f, p } = tested(row(sum, df), interaction);
		const against = f === undefined || p === undefined ? undefined : { f, p };
		return { ...tested(row(sum, df), residual), againstInteraction: against };
	};
	return {
		part: main(people * trials * square(byPart, grand), parts - 1),
		person: main(parts * trials * square(byPerson, grand), people - 1),
		interaction,
		residual
	};
}

/** The interaction counted as scatter: what is left when it is taken to be chance. */
export function pooledTable({ part, person, interaction, residual }: AnovaTable): AnovaTable {
	if (!interaction) throw new RangeError('it is pooled already');
	const pooled = row(
		interaction.sumOfSquares + residual.sumOfSquares,
		interaction.df + residual.df
	);
	const again = ({ sumOfSquares, df }: AnovaRow) => tested(row(sumOfSquares, df), pooled);
	return { part: again(part), person: again(person), residual: pooled };
}

function row(sumOfSquares: number, df: number): AnovaRow {
	return { df, sumOfSquares, meanSquare: sumOfSquares / df };
}

/** Without any scatter to hold it against, a row has no F. */
function tested(one: AnovaRow, against: AnovaRow): AnovaRow {
	const f = one.meanSquare / against.meanSquare;
	return Number.isFinite(f) ? { ...one, f, p: fUpperTail(f, one.df, against.df) } : one;
}
