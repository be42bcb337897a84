import { patternFaults, type Bolt } from '$lib/kernel/fasteners/bolt-pattern';
import type { Direction } from '$lib/kernel/fasteners/departure';
import {
	loosening,
	orderFromMiddle,
	orderFromOutside
} from '$lib/kernel/fasteners/tightening-order';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { textOf } from '../cells';
import { choice, words } from '../field';
import type { ResultLine } from '../worked';
import { boltsOf, namesIn, patternFields } from './orders/bolts-of';
import { orderSteps } from './orders/order-steps';
import { judgedOrder } from './orders/own-order';

/** The order of a bolt pattern, and the first wrong step of somebody's own. */
export const tighteningOrder = calculator({
	key: 'tightening-order',
	title: 'Tightening order',
	says: 'A sound order for a bolt pattern where the maker prints none, the order of loosening, and the first wrong step of an order of your own.',
	drawer: 'fasteners',
	caution:
		'Where the maker prints an order it wins, and no mirror image of it does. A head that is loosened in any order, or warm, warps as surely as one that is tightened so.',
	formulas: [
		'fasteners/sound-next',
		'fasteners/order-from-middle',
		'fasteners/sound-next-loose',
		'fasteners/order-from-outside',
		'fasteners/ring-pattern'
	],
	fields: {
		...patternFields,
		direction: choice({
			words: 'What is done',
			options: [
				{ value: 'tighten', words: 'Tighten' },
				{ value: 'loosen', words: 'Loosen' }
			],
			example: 'tighten',
			initial: 'tighten'
		}),
		printed: words({
			words: 'Order that the maker prints for tightening',
			hint: 'Names between spaces. It wins over any rule; loosening is its reverse.',
			most: 400,
			optional: true,
			example: ''
		}),
		own: words({
			words: 'Your order, to be checked',
			hint: 'Names between spaces, also unfinished.',
			most: 400,
			optional: true,
			example: 'A2 B3 B2 A3 A1 B4 B1 A4'
		})
	},
	work({ direction, printed, own, ...told }) {
		const bolts = boltsOf(told);
		if (!bolts.ok) return bolts;
		const typed = namesIn(printed);
		const printedOrder = typed.length > 0 ? typed : undefined;
		const [fault] = patternFaults({
			bolts: bolts.value,
			...(printedOrder ? { printedOrder } : {})
		});
		if (fault) return cannot(fault);
		const order = orderOf(bolts.value, direction, printedOrder);
		if (!order.ok) return order;
		const lines: ResultLine[] = [
			{
				key: 'order',
				words: direction === 'loosen' ? 'Loosen in this order' : 'Tighten in this order',
				text: order.value.join(' → '),
				main: true
			}
		];
		const mine = namesIn(own);
		const judged =
			mine.length > 0
				? judgedOrder(bolts.value, mine, direction, printedOrder && order.value)
				: undefined;
		if (judged && !judged.ok) return judged;
		if (judged)
			lines.push({ key: 'own', words: 'Your order', text: judged.value.says, main: true });
		const { held, wrong, wouldDo } = judged?.value ?? {};
		return computed({
			lines,
			working: orderSteps(bolts.value, order.value, direction, printedOrder !== undefined),
			notes: [
				printedOrder
					? 'The printed order is the only one: its mirror image is wrong at the first step.'
					: 'Several orders are sound, mirror images among them. This is one of them.',
				...(direction === 'tighten'
					? ['Take every bolt through one stage before any bolt begins the next.']
					: [])
			],
			drawing: {
				kind: 'pattern-order',
				bolts: bolts.value,
				order: held === undefined ? order.value : mine.slice(0, held),
				...(wrong === undefined ? {} : { wrong }),
				...(wouldDo === undefined ? {} : { wouldDo })
			}
		});
	},
	presets: (sheet) =>
		sheet.patterns.map(({ key, words: title, bolts, printedOrder }) => ({
			key,
			words: title,
			values: {
				shape: 'places',
				bolts: textOf(bolts.map(({ id, xMm, yMm }) => [id, String(xMm), String(yMm)])),
				printed: printedOrder?.join(' ') ?? '',
				own: ''
			}
		}))
});

function orderOf(
	bolts: readonly Bolt[],
	direction: Direction,
	printed?: readonly string[]
): Outcome<string[]> {
	if (printed) return computed(direction === 'loosen' ? loosening(printed) : [...printed]);
	return direction === 'loosen' ? orderFromOutside(bolts) : orderFromMiddle(bolts);
}
