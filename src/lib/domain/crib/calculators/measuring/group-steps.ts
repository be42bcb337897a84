import type { AnovaRow } from '$lib/kernel/measurement/gauge-study/anova-table';
import type { AnovaStudy } from '$lib/kernel/measurement/gauge-study/by-anova';
import type { RangeStudy } from '$lib/kernel/measurement/gauge-study/by-ranges';
import type { StudyFigures } from '$lib/kernel/measurement/gauge-study/figures';
import type { StudyMeaning } from '$lib/kernel/measurement/gauge-study/meaning';
import { mean, partMeans } from '$lib/kernel/measurement/gauge-study/study';
import type { Step } from '../../../working';
import type { Group } from './group';
import { printed } from './printed';

/** The sheet of paper: mean ranges, differences of means, and what they make of EV, AV and PV. */
export function rangeSteps(
	{ factors, ...found }: RangeStudy,
	{ people, parts, study }: Group,
	meaning: StudyMeaning,
	decimals: number
): Step[] {
	const trials = study[0]?.length ?? 0;
	const mm = (value: number) => ({ value, unit: 'mm', decimals });
	const p = (value: number) => printed(value, decimals + 1);
	const { figures } = found;
	const k = (value: number) => printed(value, 4);
	return [
		...people.map((name, at) => ({
			words: `${name}: mean of all readings, and mean range of the repeats ${p(found.personMeanRanges[at] ?? 0)} mm`,
			...mm(found.personMeans[at] ?? 0)
		})),
		{
			words: 'Mean range',
			rule: 'R̄ = Σ R / people',
			formula: `(${found.personMeanRanges.map(p).join(' + ')}) / ${people.length}`,
			...mm(found.meanRange)
		},
		{
			words: 'Repeatability',
			rule: `EV = R̄ · K1, K1 = 1 / d2(${trials})`,
			formula: `${p(found.meanRange)} · ${k(factors.k1)}`,
			...mm(figures.repeatability)
		},
		{
			words: 'Reproducibility',
			rule: `AV = √((X̄diff · K2)² − EV² / (n · r)), nothing below zero; K2 = 1 / d2*(${people.length})`,
			formula: `√((${p(found.meanDifference)} · ${k(factors.k2)})² − ${p(figures.repeatability)}² / (${parts.length} · ${trials}))`,
			...mm(figures.reproducibility)
		},
		{
			words: 'Between parts',
			rule: `PV = Rp · K3, K3 = 1 / d2*(${parts.length})`,
			formula: `${p(found.partRange)} · ${k(factors.k3)}`,
			...mm(figures.parts)
		},
		...lastSteps(figures, meaning, decimals)
	];
}

/** The table of variances, what was pooled, and the components that follow. */
export function anovaSteps(
	{ crossed, table, pooled, variance, figures }: AnovaStudy,
	{ people, parts, study }: Group,
	meaning: StudyMeaning,
	decimals: number
): Step[] {
	const [n, k, r] = [parts.length, people.length, study[0]?.length ?? 0];
	const ms = (row: AnovaRow) => row.meanSquare.toExponential(3);
	const row = (words: string, rule: string, one: AnovaRow): Step => ({
		words: `${words}: mean square, ${one.df} degrees of freedom${one.f === undefined ? '' : `, F ${printed(one.f, 2)}`}${one.p === undefined ? '' : `, ${chance(one.p)}`}`,
		rule,
		formula: `${one.sumOfSquares.toExponential(3)} / ${one.df} = ${ms(one)} mm²`
	});
	const cross = table.interaction ?? table.residual;
	const deviation = (words: string, rule: string, formula: string, value: number): Step => ({
		words,
		rule,
		formula,
		value,
		unit: 'mm',
		decimals
	});
	const means = (words: string, values: readonly number[]): Step => ({
		words,
		formula: `${values.map((one) => printed(one, decimals + 1)).join(', ')} mm`
	});
	return [
		means('Mean of all readings', [mean(study.flat(2))]),
		means(
			`Means of ${people.join(', ')}`,
			study.map((one) => mean(one.flat()))
		),
		means('Means of the parts, in their order', partMeans(study)),
		row('Parts', 'MS_p = k r Σ (part mean − mean)² / (n − 1)', crossed.part),
		row('People', 'MS_o = n r Σ (person’s mean − mean)² / (k − 1)', crossed.person),
		...(crossed.interaction
			? [
					row(
						'People by parts (interaction)',
						'MS_pi = r Σ (cell mean − part mean − person’s mean + mean)² / ((n − 1)(k − 1))',
						crossed.interaction
					)
				]
			: []),
		row('Repeats', 'MS_e = Σ (reading − cell mean)² / (n k (r − 1))', crossed.residual),
		...(pooled
			? [
					row(
						'The interaction may well be chance, and is counted as repeats',
						'MS_e = (SS_pi + SS_e) / (df_pi + df_e)',
						table.residual
					)
				]
			: []),
		deviation('Repeatability', 'EV = √MS_e', `√${ms(table.residual)}`, figures.repeatability),
		deviation(
			'Reproducibility',
			pooled
				? 'AV = √((MS_o − MS_e) / (n r)), nothing below zero'
				: 'AV = √((MS_o − MS_pi) / (n r) + (MS_pi − MS_e) / r), no term below zero',
			pooled
				? `√((${ms(table.person)} − ${ms(cross)}) / (${n} · ${r}))`
				: `√(${variance.person.toExponential(3)} + ${variance.interaction.toExponential(3)})`,
			figures.reproducibility
		),
		deviation(
			'Between parts',
			`PV = √((MS_p − ${pooled ? 'MS_e' : 'MS_pi'}) / (k r)), nothing below zero`,
			`√((${ms(table.part)} − ${ms(cross)}) / (${k} · ${r}))`,
			figures.parts
		),
		...lastSteps(figures, meaning, decimals)
	];
}

function chance(p: number): string {
	return p < 0.001 ? 'by chance in less than 0.1 %' : `by chance in ${printed(100 * p, 1)} %`;
}

function lastSteps(figures: StudyFigures, meaning: StudyMeaning, decimals: number): Step[] {
	const p = (value: number) => printed(value, decimals + 1);
	const mm = (value: number) => ({ value, unit: 'mm', decimals });
	return [
		{
			words: 'Both together',
			rule: 'GRR = √(EV² + AV²)',
			formula: `√(${p(figures.repeatability)}² + ${p(figures.reproducibility)}²)`,
			...mm(figures.gauge)
		},
		{
			words: 'Sorts of part told apart, cut to a whole number',
			rule: '1.41 · PV / GRR',
			formula: `1.41 · ${p(figures.parts)} / ${p(figures.gauge)}`,
			value: figures.categoriesRaw,
			unit: '',
			decimals: 2
		},
		{
			words: 'Guard band of anybody’s reading',
			rule: 'U = 2 · GRR',
			formula: `2 · ${p(figures.gauge)}`,
			...mm(meaning.expanded)
		},
		{
			words: 'Two people’s readings of one part, apart by no more than this 95 times in 100',
			rule: '1.96 · √2 · GRR',
			formula: `1.96 · √2 · ${p(figures.gauge)}`,
			...mm(meaning.apart)
		}
	];
}
