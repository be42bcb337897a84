import { formatQuantity } from '$lib/kernel/quantity/format-quantity';
import { stepAfter } from '$lib/kernel/quantity/reading-in';
import { convert, type DimensionName } from '$lib/kernel/quantity/units';
import type { DualScaleDrawing, Marks } from '../../drawings/dual-scale';
import { significant } from './significant';

/** What is typed on one edge and its counterpart on the other, from nothing to half as much again. */
export function scalesOf(
	dimension: DimensionName,
	value: number,
	unit: string,
	other: string
): Omit<DualScaleDrawing, 'kind'> {
	const far = value === 0 ? 10 : value * 1.5;
	// A thermometer has no beginning: its scale reaches as far to either side.
	const [from, to] =
		dimension === 'temperature'
			? [value - 40, value + 40]
			: [Math.min(0, far), Math.max(0, value === 0 ? 10 : far)];
	const there = (one: number) => convert(dimension, one, unit as never, other as never);
	return {
		upper: { unit, marks: marksBetween(from, to), reads: significant(value) },
		lower: {
			unit: other,
			marks: marksBetween(there(from), there(to)),
			reads: significant(there(value))
		},
		pointer: (value - from) / (to - from)
	};
}

function marksBetween(from: number, to: number): Marks {
	const span = to - from;
	const step = stepAfter(span, 1 / 20);
	const long = 5;
	const first = Math.ceil(from / step - 1e-9);
	const count = Math.floor(to / step + 1e-9) - first + 1;
	return Array.from({ length: Math.max(0, Math.min(60, count)) }, (_, at) => {
		const index = first + at;
		const mark = { at: (index * step - from) / span };
		return index % long === 0
			? { ...mark, words: formatQuantity(index * step, '', step * long) }
			: mark;
	});
}
