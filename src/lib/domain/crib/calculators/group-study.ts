import { studyByAnova } from '$lib/kernel/measurement/gauge-study/by-anova';
import { studyByRanges } from '$lib/kernel/measurement/gauge-study/by-ranges';
import type { StudyFigures } from '$lib/kernel/measurement/gauge-study/figures';
import { studyMeaning, type StudyMeaning } from '$lib/kernel/measurement/gauge-study/meaning';
import { cannot, computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { choice, quantity, table } from '../field';
import type { ResultLine } from '../worked';
import { groupDrawing, groupOf, mostParts, type Group } from './measuring/group';
import { anovaSteps, rangeSteps } from './measuring/group-steps';
import { limitPresets } from './measuring/limit-presets';
import { placesFor } from './measuring/printed';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const limit = { ...length, decimals: 4, optional: true } as const;

/** How well a group reads: the same parts, measured several times by each. */
export const groupStudy = calculator({
	key: 'group-study',
	title: 'How well a group reads',
	says: 'From the same parts measured several times by each person: how far two of them may differ, what that does to a ruling, and whether to mend the tool or the way of using it.',
	drawer: 'measuring',
	caution:
		'Hand the parts out unmarked and in another order each time. A group that sees its earlier figures repeats them, and looks better than it is.',
	formulas: [
		'measurement/study-by-anova',
		'measurement/study-by-ranges',
		'measurement/range-constants',
		'measurement/study-figures',
		'measurement/percent-of-tolerance',
		'measurement/study-meaning'
	],
	fields: {
		readings: table({
			...length,
			words: 'Readings',
			hint: 'One row for each time that a person went through the parts, with the name in front. Paste it from a spreadsheet if you have it.',
			row: 'Row',
			columns: [
				{ key: 'person', words: 'Person', of: 'text' },
				...Array.from({ length: mostParts }, (_, at) => ({
					key: `part${at + 1}`,
					words: `Part ${at + 1}`,
					of: 'quantity' as const,
					optional: true
				}))
			],
			rows: { from: 6, least: 4, most: 30 },
			example: [
				'Ana_39.991_39.984_39.978_39.987_39.994',
				'Ana_39.992_39.984_39.979_39.986_39.994',
				'Bo_39.990_39.982_39.976_39.985_39.993',
				'Bo_39.990_39.983_39.977_39.985_39.992',
				'Cy_39.992_39.985_39.979_39.988_39.995',
				'Cy_39.991_39.985_39.980_39.987_39.995'
			].join('*')
		}),
		method: choice({
			words: 'Worked by',
			options: [
				{ value: 'anova', words: 'Analysis of variance' },
				{ value: 'ranges', words: 'Averages and ranges, as on paper' }
			],
			initial: 'anova',
			example: 'anova'
		}),
		least: quantity({ ...limit, words: 'At least', example: '39.980' }),
		most: quantity({ ...limit, words: 'At most', example: '39.996' })
	},
	work({ readings, method, least, most }) {
		if ((least === undefined) !== (most === undefined))
			return cannot('give both limits, or neither');
		const width = least === undefined || most === undefined ? undefined : most - least;
		const group = groupOf(readings);
		if (!group.ok) return group;
		const ranges = studyByRanges(group.value.study);
		if (!ranges.ok) return ranges;
		const anova = studyByAnova(group.value.study);
		if (!anova.ok) return anova;
		const figures = method === 'anova' ? anova.value.figures : ranges.value.figures;
		const meaning = studyMeaning(figures, width);
		if (!meaning.ok) return meaning;
		const decimals = placesFor(meaning.value.expanded) + 1;
		return computed({
			lines: linesOf(group.value, figures, meaning.value, decimals),
			working:
				method === 'anova'
					? anovaSteps(anova.value, group.value, meaning.value, decimals)
					: rangeSteps(ranges.value, group.value, meaning.value, decimals),
			notes: [
				...(ranges.value.figures.categories !== anova.value.figures.categories
					? [
							`Averages and ranges tell ${sorts(ranges.value.figures.categories)} apart, analysis of variance ${sorts(anova.value.figures.categories)}: say which one you used.`
						]
					: []),
				...ranges.value.overLimit.map(
					({ person, part, range }) =>
						`${group.value.people[person]}, ${group.value.parts[part]}: the repeats differ by ${range.toFixed(decimals)} mm, more than the others’ lead one to expect. Have that one measured again.`
				)
			],
			drawing: groupDrawing(group.value, meaning.value.expanded, decimals)
		});
	},
	presets: (sheet) =>
		limitPresets(sheet)
			.filter(({ limits }) => limits.least !== '' && limits.most !== '')
			.map(({ key, words, limits }) => ({ key, words, values: limits }))
});

const verdicts: Record<StudyMeaning['verdict'], string> = {
	fit: 'Fit: the group’s own scatter hardly counts',
	'may-do': 'May do, where a reading close to a limit is measured again',
	unfit: 'Not fit: too much of what is seen is the measuring itself'
};
const mends: Record<StudyMeaning['mend'], string> = {
	tool: 'Most of it is one person reading one part again: look at the tool, its stand and its feel',
	people: 'Most of it is between people: agree how the tool is set, held and read'
};

function linesOf(
	{ people }: Group,
	figures: StudyFigures,
	meaning: StudyMeaning,
	decimals: number
): ResultLine[] {
	const mm = { unit: 'mm', decimals };
	const percent = { unit: '%', decimals: 1 };
	const between = people.length === 2 ? 'The two' : `Any two of the ${people.length}`;
	return [
		{
			key: 'apart',
			words: `${between} may read one part apart by up to`,
			value: meaning.apart,
			...mm,
			main: true
		},
		{
			key: 'expanded',
			words: 'Guard band of anybody’s reading (U)',
			value: meaning.expanded,
			...mm,
			main: true
		},
		{
			key: 'verdict',
			words: 'What it means',
			text: `${verdicts[meaning.verdict]}. ${mends[meaning.mend]}.`
		},
		...(meaning.percentOfTolerance === undefined
			? []
			: [
					{
						key: 'tolerance',
						words: 'Of the limits’ width',
						value: meaning.percentOfTolerance,
						...percent
					}
				]),
		{ key: 'study', words: 'Of what the study saw', value: figures.percent.gauge, ...percent },
		{
			key: 'repeatability',
			words: 'Repeatability, one person again (EV)',
			value: figures.repeatability,
			...mm
		},
		{
			key: 'reproducibility',
			words: 'Reproducibility, between people (AV)',
			value: figures.reproducibility,
			...mm
		},
		{ key: 'gauge', words: 'Both together (GRR)', value: figures.gauge, ...mm },
		{ key: 'parts', words: 'Between parts (PV)', value: figures.parts, ...mm },
		{
			key: 'categories',
			words: 'Sorts of part that it can tell apart',
			value: figures.categories,
			unit: '',
			decimals: 0
		}
	];
}

function sorts(count: number): string {
	return count === 1 ? '1 sort of part' : `${count} sorts of part`;
}
