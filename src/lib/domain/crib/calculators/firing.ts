import { bankedThrowDeg, evenThrowsDeg } from '$lib/kernel/cylinder/crank-throws';
import { companions, cycleDeg, firingsOf, intervalsOf } from '$lib/kernel/cylinder/firing';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { choice, table, words, type TableRow } from '../field';
import type { ResultLine } from '../worked';
import { firingSteps, inDegrees, orderTyped } from './cylinder/firing-steps';

/** When each cylinder fires, from the order and the crank. */
export const firing = calculator({
	key: 'firing',
	title: 'Firing intervals',
	says: 'When each cylinder fires on its crank, how far apart, and which two come to top dead centre together.',
	drawer: 'cylinder',
	caution:
		'An order is worth nothing without the maker’s numbering of the cylinders. Turn the engine by hand in its own sense of rotation when you look for a top dead centre.',
	formulas: [
		'cylinder/even-interval',
		'cylinder/even-throws',
		'cylinder/banked-throw',
		'cylinder/firings'
	],
	fields: {
		order: words({
			words: 'Firing order',
			hint: 'As it is printed: 1-3-4-2.',
			most: 60,
			example: '1-3-4-2'
		}),
		cycle: choice({
			words: 'Cycle',
			options: [
				{ value: 'four-stroke', words: 'Four-stroke' },
				{ value: 'two-stroke', words: 'Two-stroke' }
			],
			initial: 'four-stroke',
			example: 'four-stroke'
		}),
		throws: table({
			dimension: 'angle',
			unit: { metric: '°', inch: '°' },
			words: 'Crankpins',
			hint: 'How far each pin lies behind that of cylinder 1 in the sense of rotation, and how far its bank leans the same way. Left out: the crank on which this order fires evenly.',
			row: 'Cylinder',
			columns: [
				{ key: 'pin', words: 'Pin behind', of: 'quantity' },
				{ key: 'bank', words: 'Bank leans', of: 'quantity', optional: true }
			],
			rows: { from: 4, least: 1, most: 16 },
			optional: true,
			example: '0_*180_*180_*0_'
		})
	},
	work({ order: typed, cycle, throws: rows }) {
		const order = orderTyped(typed);
		if (!order.ok) return order;
		const throws = rows ? throwsOf(rows) : evenThrowsDeg(order.value, cycle);
		if (!throws.ok) return throws;
		const found = firingsOf(throws.value, order.value, cycle);
		if (!found.ok) return found;
		const firings = found.value;
		const { leastDeg, mostDeg, even } = intervalsOf(firings);
		// Two-strokes fire at every top dead centre: nothing is half a cycle away from anything.
		const pairs = cycle === 'four-stroke' && even ? companions(order.value) : undefined;
		const degrees = { unit: '°', decimals: firings.every(isWhole) ? 0 : 1 };
		const lines: ResultLine[] = [
			...(even
				? [{ key: 'interval', words: 'Evenly, every', value: leastDeg, ...degrees, main: true }]
				: [
						{
							key: 'intervals',
							words: 'Intervals',
							text: firings.map((one) => inDegrees(one.toNextDeg)).join(', '),
							main: true
						},
						{ key: 'least', words: 'Shortest', value: leastDeg, ...degrees },
						{ key: 'most', words: 'Longest', value: mostDeg, ...degrees }
					]),
			...firings.map(({ cylinder, atDeg }) => ({
				key: `at-${cylinder}`,
				words: `Cylinder ${cylinder} fires at`,
				value: atDeg,
				...degrees
			})),
			...(pairs?.ok
				? [
						{
							key: 'pairs',
							words: 'Together at top dead centre, one firing, one changing gas',
							text: pairs.value.map((one) => one.join(' with ')).join('; ')
						}
					]
				: [])
		];
		return computed({
			lines,
			working: firingSteps(firings, throws.value, cycle),
			notes: even
				? []
				: [
						'It fires unevenly. If that surprises you, look whether the pins are counted in the sense of rotation, and the cylinders as the maker numbers them.'
					],
			drawing: { kind: 'firing', fullDeg: cycleDeg[cycle], firings, even }
		});
	},
	presets: ({ layout }) =>
		layout
			? [
					{
						key: 'layout',
						words: 'Firing order and cycle',
						values: { order: layout.firingOrder.join('-'), cycle: layout.cycle }
					}
				]
			: []
});

const isWhole = ({ atDeg, toNextDeg }: { atDeg: number; toNextDeg: number }) =>
	Math.abs(atDeg - Math.round(atDeg)) + Math.abs(toNextDeg - Math.round(toNextDeg)) < 1e-6;

function throwsOf(rows: readonly TableRow[]): Outcome<number[]> {
	const throws: number[] = [];
	for (const [at, { pin, bank }] of rows.entries()) {
		const found = bankedThrowDeg(Number(pin), Number(bank ?? 0));
		if (!found.ok) return cannot(`cylinder ${at + 1}: ${found.because}`);
		throws.push(found.value);
	}
	return computed(throws);
}
