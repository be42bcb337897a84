import { shimPlan, type ShimChoice } from '$lib/kernel/geometry/shim-plan';
import type { ShimmedValve } from '$lib/kernel/geometry/shimmed-valve';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { DataSheet } from '../../data-sheets/schema';
import type { Step } from '../../working';
import { calculator, type Preset } from '../calculator';
import { choice, list, quantity, table, type TableRow } from '../field';
import { figure } from './formula-figures';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const lash = { ...length, decimals: 2, least: 0, most: 5, optional: true } as const;
const shim = { ...length, decimals: 2, least: 0.1, most: 100 } as const;

/** Which shim goes to which valve, with the fewest bought: an assignment, solved exactly. */
export const valveShims = calculator({
	key: 'valve-shims',
	title: 'Valve shims',
	says: 'Which shim goes to which valve, from those fitted and those in the box, with as few as possible to buy and every lash within its limits.',
	drawer: 'faces',
	caution:
		'Measure every lash with the cam lobe pointing away, at the temperature that the maker states, and write the table before a camshaft is lifted. Measure shims with a micrometer: the stamp may be worn off or wrong. Turn the engine twice by hand and measure again before it runs; a valve left without lash burns.',
	formulas: ['geometry/shim-for-lash', 'geometry/shim-plan', 'geometry/nearest-shim'],
	fields: {
		valves: table({
			...length,
			words: 'Valves',
			hint: 'Kind: in or ex.',
			row: 'Valve',
			columns: [
				{ key: 'name', words: 'Name', of: 'text' },
				{ key: 'kind', words: 'Kind', of: 'text' },
				{ key: 'shim', words: 'Shim fitted', of: 'quantity' },
				{ key: 'lash', words: 'Lash', of: 'quantity' }
			],
			rows: { from: 6, least: 1, most: 32 },
			example:
				'I1_in_2.50_0.26*E1_ex_2.60_0.22*I2_in_2.45_0.20*E2_ex_2.50_0.41*I3_in_2.55_0.14*E3_ex_2.60_0.30'
		}),
		inletLeast: quantity({ ...lash, words: 'Inlet lash, least', example: '0.18' }),
		inletMost: quantity({ ...lash, words: 'Inlet lash, most', example: '0.22' }),
		exhaustLeast: quantity({ ...lash, words: 'Exhaust lash, least', example: '0.28' }),
		exhaustMost: quantity({ ...lash, words: 'Exhaust lash, most', example: '0.32' }),
		box: list({
			...length,
			words: 'Loose shims in the box',
			optional: true,
			example: '2.40; 2.56; 2.70'
		}),
		within: choice({
			words: 'Valves that are within their limits',
			options: [
				{ value: 'stays', words: 'Keep their shims' },
				{ value: 'may-move', words: 'May change theirs' }
			],
			hint: 'What may change can save a shim to buy.',
			example: 'may-move'
		}),
		from: quantity({ ...shim, words: 'Shims are sold from', example: '2.00' }),
		to: quantity({ ...shim, words: 'up to', example: '3.00' }),
		step: quantity({ ...shim, least: 0.001, words: 'in steps of', decimals: 3, example: '0.05' })
	},
	work({ valves: rows, box = [], within, from, to, step, ...limits }) {
		const valves = valvesOf(rows, limits);
		if (!valves.ok) return valves;
		const plan = shimPlan(valves.value, box, { fromMm: from, toMm: to, stepMm: step }, within);
		if (!plan.ok) return plan;
		const { choices, buy, bought, totalOffMm, spareMm } = plan.value;
		return computed({
			lines: [
				{
					key: 'buy',
					words: 'To buy',
					text:
						buy.map(({ sizeMm, count }) => `${count} of ${two(sizeMm)} mm`).join(', ') || 'nothing',
					main: true
				},
				{ key: 'bought', words: 'Shims bought', value: bought, unit: '', decimals: 0 },
				...choices.map((one) => ({
					key: `valve-${one.valve}`,
					words: one.valve,
					text: `${two(one.shimMm)} mm ${fromWords(one)}: lash ${two(one.lashMm)} mm`
				})),
				{
					key: 'off',
					words: 'Departures from the middle of the limits, together',
					value: totalOffMm,
					unit: 'mm',
					decimals: 2
				},
				...(spareMm.length > 0
					? [{ key: 'spare', words: 'Left over, mm', text: spareMm.map(two).join('; ') }]
					: [])
			],
			working: [
				...valves.value.flatMap((valve, at) => stepsOf(valve, choices[at])),
				{ words: 'Shims bought: no other plan needs fewer', value: bought, unit: '', decimals: 0 }
			],
			notes: [
				'Measure every lash again with the new shims in. Clear the ones left over into the box with their measured size.'
			],
			drawing: {
				kind: 'shims',
				valves: valves.value.map((valve, at) => {
					const one = choices[at];
					return {
						name: valve.name,
						beforeMm: valve.lashMm,
						afterMm: one?.lashMm ?? valve.lashMm,
						leastMm: valve.leastMm,
						mostMm: valve.mostMm,
						shimMm: one?.shimMm ?? valve.shimMm,
						from: one ? fromWords(one) : 'stays'
					};
				})
			}
		});
	},
	presets: presetsOf
});

type LashLimits = Record<
	'inletLeast' | 'inletMost' | 'exhaustLeast' | 'exhaustMost',
	number | undefined
>;

/** Each valve with the limits of its kind. */
function valvesOf(rows: readonly TableRow[], limits: LashLimits): Outcome<ShimmedValve[]> {
	const valves: ShimmedValve[] = [];
	for (const { name, kind, shim: shimMm, lash: lashMm } of rows) {
		const inlet = /^i/i.test(String(kind));
		if (!inlet && !/^e/i.test(String(kind)))
			return cannot(`${name}: write in or ex, inlet or exhaust`);
		const [leastMm, mostMm] = inlet
			? [limits.inletLeast, limits.inletMost]
			: [limits.exhaustLeast, limits.exhaustMost];
		if (leastMm === undefined || mostMm === undefined)
			return cannot(
				`${name}: give the least and the most lash of an ${inlet ? 'inlet' : 'exhaust'} valve`
			);
		if (typeof shimMm !== 'number' || typeof lashMm !== 'number')
			return cannot(`${name}: its shim and its lash are wanted`);
		valves.push({ name: String(name), shimMm, lashMm, leastMm, mostMm });
	}
	return computed(valves);
}

function stepsOf(valve: ShimmedValve, choice: ShimChoice | undefined): Step[] {
	if (!choice) return [];
	const { name, shimMm, lashMm } = valve;
	return [
		{
			words: `${name} with ${choice.from === 'stays' ? 'its own shim' : `the shim ${fromWords(choice)}`}, limits ${two(valve.leastMm)} to ${two(valve.mostMm)} mm`,
			rule: 'lash = A + T − N',
			formula: `${two(lashMm)} + ${two(shimMm)} − ${two(choice.shimMm)}`,
			value: choice.lashMm,
			unit: 'mm',
			decimals: 3
		}
	];
}

function fromWords({ from, giver }: ShimChoice): string {
	return { stays: 'stays', valve: `from ${giver}`, box: 'from the box', bought: 'bought' }[from];
}

/** Two places, and a third where a micrometer showed one. */
function two(valueMm: number): string {
	return figure(valueMm).replace(/0$/, '');
}

function presetsOf(sheet: DataSheet): Preset[] {
	const limits = (key: string, kind: string) => {
		const build = sheet.dimensions.find((one) => one.key === key)?.build;
		return build
			? { [`${kind}Least`]: String(build.least), [`${kind}Most`]: String(build.most) }
			: {};
	};
	const lashes = {
		...limits('valve.inletLash', 'inlet'),
		...limits('valve.exhaustLash', 'exhaust')
	};
	if (Object.keys(lashes).length === 0) return [];
	const ranges = sheet.shims.map(({ key, words, fromMm, toMm, stepMm }) => ({
		key,
		words: `Valve lash, cold, and ${words.charAt(0).toLowerCase()}${words.slice(1)}`,
		values: { ...lashes, from: String(fromMm), to: String(toMm), step: String(stepMm) }
	}));
	return ranges.length > 0
		? ranges
		: [{ key: 'valve.lash', words: 'Valve lash, cold', values: lashes }];
}
