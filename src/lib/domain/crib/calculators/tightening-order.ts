import { patternFaults } from '$lib/kernel/fasteners/bolt-pattern';
import { departureFromSound, firstWrongStep } from '$lib/kernel/fasteners/departure';
import { loosening, orderFromMiddle } from '$lib/kernel/fasteners/tightening-order';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { textOf } from '../cells';
import { calculator } from '../calculator';
import { choice, table, words, type TableRow } from '../field';
import type { ResultLine } from '../worked';

type Bolt = { id: string; xMm: number; yMm: number };

/** The order of a bolt pattern, and the first wrong step of somebody's own. */
export const tighteningOrder = calculator({
	key: 'tightening-order',
	title: 'Tightening order',
	says: 'A sound order for a bolt pattern where the maker prints none, its reverse for loosening, and the first wrong step of an order of your own.',
	drawer: 'fasteners',
	caution:
		'Where the maker prints an order it wins, and no mirror image of it does. A head that is loosened in any order warps as surely as one that is tightened so.',
	formulas: ['fasteners/sound-next', 'fasteners/order-from-middle'],
	fields: {
		bolts: table({
			dimension: 'length',
			unit: { metric: 'mm', inch: 'in' },
			words: 'Bolts',
			hint: 'A name and a place each; paste three columns from a spreadsheet.',
			row: 'Bolt',
			columns: [
				{ key: 'id', words: 'Name', of: 'text' },
				{ key: 'x', words: 'x', of: 'quantity' },
				{ key: 'y', words: 'y', of: 'quantity' }
			],
			rows: { from: 8, least: 2, most: 60 },
			example: 'A1_-129_45*A2_-43_45*A3_43_45*A4_129_45*B1_-129_-45*B2_-43_-45*B3_43_-45*B4_129_-45'
		}),
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
			hint: 'Names between spaces. It wins over any rule.',
			most: 400,
			optional: true,
			example: ''
		}),
		own: words({
			words: 'Your order, to be checked',
			hint: 'Names between spaces.',
			most: 400,
			optional: true,
			example: 'A2 B3 B2 A3 A1 B4 B1 A4'
		})
	},
	work({ bolts: rows, direction, printed, own }) {
		const bolts = rows.map(boltOf);
		const printedOrder = namesIn(printed);
		const [fault] = patternFaults({ bolts, ...(printedOrder.length > 0 ? { printedOrder } : {}) });
		if (fault) return cannot(fault);
		const tighten: Outcome<string[]> =
			printedOrder.length > 0 ? computed(printedOrder) : orderFromMiddle(bolts);
		if (!tighten.ok) return tighten;
		const order = direction === 'loosen' ? loosening(tighten.value) : tighten.value;
		const lines: ResultLine[] = [
			{
				key: 'order',
				words: direction === 'loosen' ? 'Loosen in this order' : 'Tighten in this order',
				text: order.join(' → '),
				main: true
			}
		];
		const mine = namesIn(own);
		if (mine.length > 0) {
			const verdict = judged(bolts, order, mine, direction, printedOrder.length > 0);
			if (!verdict.ok) return cannot(`your order: ${verdict.because}`);
			lines.push({ key: 'own', words: 'Your order', text: verdict.value, main: true });
		}
		return computed({
			lines,
			working: [
				{
					words:
						printedOrder.length > 0
							? 'The printed order wins over any rule.'
							: 'No order is printed: a flange is crossed in pairs, anything else goes from the middle outwards.',
					rule: 'flange: farthest from what is tight, then across; else nearest the middle',
					formula: order.join(', ')
				}
			],
			notes:
				printedOrder.length > 0
					? []
					: ['Several orders are sound, mirror images among them. This is one of them.'],
			drawing: { kind: 'pattern-order', bolts, order }
		});
	},
	presets: (sheet) =>
		sheet.patterns.map(({ key, words: title, bolts, printedOrder }) => ({
			key,
			words: title,
			values: {
				bolts: textOf(bolts.map(({ id, xMm, yMm }) => [id, String(xMm), String(yMm)])),
				printed: printedOrder?.join(' ') ?? '',
				own: ''
			}
		}))
});

function boltOf({ id, x, y }: TableRow): Bolt {
	return { id: String(id ?? ''), xMm: Number(x ?? NaN), yMm: Number(y ?? NaN) };
}

function namesIn(text: string | undefined): string[] {
	return (text ?? '').split(/[\s,;→]+/).filter(Boolean);
}

function judged(
	bolts: Bolt[],
	order: string[],
	mine: string[],
	direction: 'tighten' | 'loosen',
	isPrinted: boolean
): Outcome<string> {
	if (isPrinted) {
		const found = firstWrongStep(order, mine);
		if (!found.ok) return found;
		return computed(
			found.value
				? `wrong at step ${found.value.step}: ${found.value.was}, where ${found.value.wanted} comes`
				: 'as it is printed, from the first bolt to the last'
		);
	}
	const found = departureFromSound(bolts, mine, direction);
	if (!found.ok) return found;
	return computed(
		found.value
			? `leaves every sound order at step ${found.value.step}: ${found.value.was}, where ${found.value.sound.join(' or ')} would do`
			: 'sound, from the first bolt to the last'
	);
}
