import type { Stage } from '$lib/kernel/fasteners/plan';
import { stageFaults } from '$lib/kernel/fasteners/stage-faults';
import { stagePasses, type Pass } from '$lib/kernel/fasteners/stage-passes';
import { lastTorqueNm, thirdsNm, turnedDeg } from '$lib/kernel/fasteners/stage-sequence';
import { orderFromMiddle } from '$lib/kernel/fasteners/tightening-order';
import { parseStages } from '$lib/kernel/quantity/parse-stages';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { DataSheet } from '../../data-sheets/schema';
import { calculator, type Preset } from '../calculator';
import type { StageRound } from '../drawings/stage-rounds';
import { choice, number, words } from '../field';
import { figure, plain } from './formula-figures';
import { namesIn } from './orders/bolts-of';

/** A tightening plan as rounds to tick off at the engine. */
export const stages = calculator({
	key: 'stages',
	title: 'Stages to tick off',
	says: 'A tightening plan as a list for the bench: every bolt through one stage before any begins the next, with a box for each.',
	drawer: 'fasteners',
	caution:
		'Whoever is called away between two stages loses count: tick each bolt as it is done, and begin the whole pattern again where you are not sure. Bolts that are turned by an angle past yield are not used again.',
	formulas: ['fasteners/thirds'],
	sources: [
		'All bolts through one stage before the next: US Army TM 10-3930-669-20, para E-4. Slackening between, in the reverse order: settling cycles of makers’ head schedules.'
	],
	fields: {
		order: words({
			words: 'Bolts in their order',
			hint: 'Names between spaces, first to last; the tightening order gives them.',
			most: 400,
			example: 'A2 B3 B2 A3 A1 B4 B1 A4'
		}),
		plan: words({
			words: 'Stages',
			hint: 'As printed: 20 N·m, 40 N·m, 90°. A bare figure is in N·m.',
			most: 200,
			example: '20 N·m, 40 N·m, 90°'
		}),
		taken: choice({
			words: 'Taken',
			options: [
				{ value: 'as-typed', words: 'In the stages that are typed' },
				{ value: 'in-thirds', words: 'One torque, in thirds' }
			],
			hint: 'Thirds are common practice where the maker prints one figure only.',
			initial: 'as-typed',
			example: 'as-typed'
		}),
		slackenAfter: number({
			words: 'All bolts slackened again after stage',
			hint: 'Where the plan settles its gasket first: the number of the stage.',
			whole: true,
			least: 1,
			most: 11,
			optional: true,
			example: ''
		})
	},
	work({ order: typed, plan, taken, slackenAfter }) {
		const order = namesIn(typed);
		const twice = order.find((id, at) => order.indexOf(id) < at);
		if (twice !== undefined) return cannot(`${twice} is named twice in the order`);
		const read = parseStages(plan, 'N·m');
		if (!read.ok) return read;
		const printed = taken === 'in-thirds' ? inThirds(read.value) : computed(read.value);
		if (!printed.ok) return printed;
		const list = printed.value;
		const [fault] = stageFaults(list, slackenAfter);
		if (fault) return cannot(fault);
		const passes = stagePasses(order, list.length, slackenAfter);
		if (!passes.ok) return passes;
		const rounds = passes.value.map((pass) => roundOf(pass, list));
		const boxes = passes.value.reduce((sum, pass) => sum + pass.bolts.length, 0);
		const last = list.slice(slackenAfter ?? 0);
		const torque = lastTorqueNm(last);
		const angle = turnedDeg(last);
		return computed({
			lines: [
				{ key: 'plan', words: 'Plan', text: list.map(stageText).join(', '), main: true },
				{ key: 'boxes', words: 'Boxes to tick', value: boxes, unit: '', decimals: 0 },
				...(torque === undefined
					? []
					: [{ key: 'torque', words: 'Last torque', value: torque, unit: 'N·m', decimals: 1 }]),
				...(angle > 0
					? [{ key: 'angle', words: 'Turned after it', value: angle, unit: '°', decimals: 0 }]
					: [])
			],
			working: [
				...(taken === 'in-thirds'
					? [
							{
								words: 'One torque in three stages',
								rule: 'T/3, 2T/3, T',
								formula: list
									.map((one) => ('torqueNm' in one ? plain(one.torqueNm) : ''))
									.join(', ')
							}
						]
					: []),
				{
					words: 'Bolts, times the rounds of the whole pattern',
					rule: 'boxes = bolts · rounds',
					formula: `${order.length} · ${passes.value.length}`,
					value: boxes,
					unit: '',
					decimals: 0
				}
			],
			notes: notesFor(list, slackenAfter),
			drawing: { kind: 'stage-rounds', rounds }
		});
	},
	presets: presetsOf
});

function inThirds(read: readonly Stage[]): Outcome<Stage[]> {
	const [only] = read;
	if (read.length !== 1 || !only || !('torqueNm' in only))
		return cannot('thirds are taken of one torque: type that one alone');
	const found = thirdsNm(only.torqueNm);
	return found.ok ? computed(found.value.map((torqueNm) => ({ torqueNm }))) : found;
}

function roundOf({ stage, bolts }: Pass, list: readonly Stage[]): StageRound {
	const does = stage === undefined ? undefined : list[stage - 1];
	if (stage === undefined || !does)
		return { words: 'Slacken all, last tightened first', does: 'slacken', bolts };
	return {
		words: `Stage ${stage}: ${'torqueNm' in does ? 'to' : 'on by'} ${stageText(does)}`,
		does,
		bolts
	};
}

function stageText(stage: Stage): string {
	return 'torqueNm' in stage
		? `${figure(stage.torqueNm, 1).replace(/\.0$/, '')} N·m`
		: `${plain(stage.angleDeg)}°`;
}

function notesFor(list: readonly Stage[], slackenAfter: number | undefined): string[] {
	const turns = list.some((one) => 'angleDeg' in one);
	return [
		...(turns
			? [
					'Mark each bolt and the part beside it before its angle is turned. After an angle there is no second check with the torque wrench: the joint is not held by torque any more.'
				]
			: []),
		...(slackenAfter === undefined
			? []
			: ['Slackened means to nothing, by hand from then on, until the next stage begins.'])
	];
}

/** A pattern with the stages of its fastener, in the printed order or a sound one. */
function presetsOf(sheet: DataSheet): Preset[] {
	return sheet.patterns.flatMap(({ key, words: title, bolts, printedOrder, fastener }) => {
		const found = sheet.fasteners.find((one) => one.key === fastener);
		const order = printedOrder ? computed(printedOrder) : orderFromMiddle(bolts);
		if (!found || !order.ok) return [];
		const plan = found.stages.map(stageText).join(', ');
		return [
			{
				key,
				words: title,
				values: { order: order.value.join(' '), plan, taken: 'as-typed', slackenAfter: '' }
			}
		];
	});
}
