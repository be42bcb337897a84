import { inHandMm, type InHand } from '$lib/kernel/measurement/in-hand';
import { expandedFor, usualRatio, type Asked } from '$lib/kernel/measurement/tool';
import { chooseTool, type ToolChoice } from '$lib/kernel/measurement/tool-choice';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { number, quantity, table, type TableRow } from '../field';
import type { Worked } from '../worked';
import { limitPresets } from './measuring/limit-presets';
import { placesFor } from './measuring/printed';
import { repeatNotes, toolSteps, verdictWords } from './measuring/tool-steps';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const limit = { ...length, decimals: 4, optional: true } as const;

/** Before measuring: which of the tools at hand can judge by these limits at all. */
export const whichTool = calculator({
	key: 'which-tool',
	title: 'Can this tool judge?',
	says: 'Before you measure: which tool can rule by these limits, which to fetch, and whether repeats would help.',
	drawer: 'measuring',
	caution:
		'A tool that cannot judge does not become able by measuring carefully. Do not build on a reading whose uncertainty fills its limits: fetch the finer tool.',
	formulas: [
		'measurement/in-hand',
		'measurement/tool',
		'measurement/expanded-for',
		'measurement/repeats-needed'
	],
	sources: ['Ten to one is the older rule of the trade; four to one is the usual least.'],
	fields: {
		least: quantity({ ...limit, words: 'At least', example: '39.980' }),
		most: quantity({ ...limit, words: 'At most', example: '39.996' }),
		room: quantity({
			...limit,
			words: 'Room inside a single limit',
			hint: 'Only where one limit stands alone: from it to where a sound part lies, such as its build limit.',
			least: 0,
			example: ''
		}),
		tools: table({
			...length,
			words: 'Tools at hand',
			hint: 'Calibration: U of the certificate, k = 2. Scatter: s of your own repeats, left empty where you do not know it.',
			row: 'Tool',
			columns: [
				{ key: 'name', words: 'Name', of: 'text' },
				{ key: 'leastCount', words: 'Least count', of: 'quantity' },
				{ key: 'calibration', words: 'Calibration', of: 'quantity', optional: true },
				{ key: 'scatter', words: 'Scatter', of: 'quantity', optional: true }
			],
			rows: { from: 3, least: 1, most: 8 },
			example:
				'Caliper_0.01_0.02_0.01*Workshop micrometer_0.01_0.004_0.003*Fine micrometer_0.001_0.0015_0.0005'
		}),
		readings: number({
			words: 'Readings that the mean is taken of',
			whole: true,
			least: 1,
			most: 50,
			initial: '1',
			example: '1'
		})
	},
	work({ least, most, room, tools, readings }) {
		const asked: Asked = {
			...(least === undefined ? {} : { least }),
			...(most === undefined ? {} : { most }),
			...(room === undefined ? {} : { room })
		};
		const inHand = toolsOf(tools);
		if (!inHand.ok) return inHand;
		const needed = expandedFor(asked);
		if (!needed.ok) return needed;
		const expanded = inHand.value.map((tool) => ({
			name: tool.name,
			expanded: inHandMm(tool, readings)
		}));
		const choice = chooseTool(expanded, asked);
		return choice.ok
			? computed(workedOf(asked, inHand.value, readings, needed.value, choice.value))
			: choice;
	},
	presets: (sheet) =>
		limitPresets(sheet).map(({ key, words, limits, room }) => ({
			key,
			words,
			values: { ...limits, room }
		}))
});

export type NamedTool = InHand & { name: string };

function toolsOf(rows: readonly TableRow[]): Outcome<NamedTool[]> {
	const tools = rows.map(({ name, leastCount, calibration, scatter }) => ({
		name: String(name),
		leastCountMm: Number(leastCount),
		calibrationMm: Number(calibration ?? 0),
		scatterMm: Number(scatter ?? 0)
	}));
	if (tools.some(({ leastCountMm }) => !(leastCountMm > 0)))
		return cannot('a least count is above zero');
	if (tools.some(({ calibrationMm, scatterMm }) => calibrationMm < 0 || scatterMm < 0))
		return cannot('a calibration and a scatter are zero or more');
	if (tools.some((one) => Math.max(one.leastCountMm, one.calibrationMm, one.scatterMm) > 1e6))
		return cannot('no tool on this bench is that coarse');
	if (new Set(tools.map(({ name }) => name)).size < tools.length)
		return cannot('two tools have the same name: tell them apart');
	return computed(tools);
}

function workedOf(
	asked: Asked,
	tools: readonly NamedTool[],
	readings: number,
	neededMm: number,
	{ judged, fetch }: ToolChoice
): Worked {
	const finest = judged.reduce((a, b) => (b.expanded < a.expanded ? b : a));
	const shown = judged.find(({ name }) => name === fetch) ?? finest;
	const decimals = Math.max(...judged.map((one) => placesFor(one.expanded)), 3);
	const mm = { unit: 'mm', decimals };
	const limits = [asked.least, asked.most].filter((one) => one !== undefined);
	const marks = [
		...limits,
		...judged.flatMap(({ judgement }) => judgement.undecided.flatMap(({ from, to }) => [from, to]))
	];
	return {
		lines: [
			{
				key: 'fetch',
				words: 'Fetch',
				text:
					fetch ??
					`None of these can judge. The finest, ${finest.name}, ${verdictWords[finest.judgement.verdict]}.`,
				main: true
			},
			{
				key: 'needed',
				words: `To judge at ${usualRatio} to 1, U is at most`,
				value: neededMm,
				...mm
			},
			{ key: 'expanded', words: `U with ${shown.name}`, value: shown.expanded, ...mm },
			{
				key: 'ratio',
				words: `Ratio with ${shown.name}`,
				value: shown.judgement.ratio,
				unit: '',
				decimals: 2
			},
			...judged.map(({ name, judgement }, at) => ({
				key: `tool-${at + 1}`,
				words: name,
				text: `${judgement.ratio.toFixed(1)} to 1: ${verdictWords[judgement.verdict]}`
			}))
		],
		working: toolSteps(asked, tools, judged, readings, neededMm, decimals),
		notes: repeatNotes(tools, judged, readings, neededMm),
		drawing: {
			kind: 'tool-zones',
			from: Math.min(...marks),
			to: Math.max(...marks),
			...(asked.least === undefined ? {} : { least: asked.least }),
			...(asked.most === undefined ? {} : { most: asked.most }),
			tools: judged.map(({ name, judgement }) => ({
				words: name,
				verdict: judgement.verdict,
				fetch: name === fetch,
				zones: judgement.undecided
			})),
			decimals
		}
	};
}
