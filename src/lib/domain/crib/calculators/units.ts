import { formatQuantity } from '$lib/kernel/quantity/format-quantity';
import { parseAny, writtenStep, type Measured } from '$lib/kernel/quantity/parse-any';
import { parseQuantity } from '$lib/kernel/quantity/parse-quantity';
import { readingIn } from '$lib/kernel/quantity/reading-in';
import {
	convert,
	dimensions,
	scaleOf,
	type DimensionName,
	type UnitOf
} from '$lib/kernel/quantity/units';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { choice, number, words } from '../field';
import type { ResultLine } from '../worked';
import { scalesOf } from './measuring/dual-scale';
import { significant } from './measuring/significant';

/** What stands beside what on instruments for both trades. */
const beside: { [D in DimensionName]: readonly [metric: UnitOf<D>, inch: UnitOf<D>] } = {
	length: ['mm', 'in'],
	torque: ['N·m', 'lbf·ft'],
	force: ['N', 'lbf'],
	pressure: ['bar', 'psi'],
	volume: ['cm³', 'in³'],
	angle: ['°', 'turn'],
	temperature: ['°C', '°F'],
	temperatureDifference: ['K', '°F'],
	power: ['kW', 'hp'],
	speed: ['m/s', 'ft/min']
};

/** One quantity in every unit of its kind. */
export const units = calculator({
	key: 'units',
	title: 'Units',
	says: 'One figure in every unit of its kind, exact, and rounded to what its instrument could tell.',
	drawer: 'measuring',
	caution:
		'Work in the units of the data sheet and convert once, at the end. A torque read in the wrong unit strips threads: N·m and lbf·ft differ by a third, lbf·in and lbf·ft twelve times.',
	formulas: ['quantity/convert'],
	fields: {
		typed: words({
			words: 'What you have',
			hint: 'Figure and unit as you would write them: 18 ft-lb, 0,045 mm, 3/8 in, 212 °F, 2.5 bar.',
			most: 60,
			example: '18 ft-lb'
		}),
		degrees: choice({
			words: 'Degrees of temperature are',
			options: [
				{ value: 'reading', words: 'What a thermometer shows' },
				{ value: 'difference', words: 'A difference of two readings' }
			],
			initial: 'reading',
			example: 'reading'
		}),
		step: number({
			words: 'Step of the instrument, in the same unit',
			hint: 'Such as 0.02 for a caliper. Left out: the last place that you wrote.',
			least: 1e-9,
			most: 1e6,
			optional: true,
			example: '0.5'
		})
	},
	work({ typed, degrees, step = writtenStep(typed) }) {
		const read = quantityIn(typed, degrees);
		if (!read.ok) return read;
		const { dimension, value, unit } = read.value;
		if (Math.abs(value) > 1e9) return cannot('nothing on this bench is that large');
		const [metric, inch] = beside[dimension];
		const main = unit === metric ? inch : metric;
		const others = Object.keys(dimensions[dimension])
			.filter((one) => one !== unit)
			.sort((a, b) => Number(b === main) - Number(a === main));
		const lines: ResultLine[] = others.flatMap((other) => {
			const there = readingIn(dimension, { value, step }, unit as never, other as never);
			const exact = `${significant(there.value)} ${other}`;
			const shown = { key: other, text: formatQuantity(there.value, other, there.step) };
			return other === main
				? [
						{ ...shown, words: `To its step of ${significant(there.step)} ${other}`, main: true },
						{ key: 'exact', words: 'To seven figures', text: exact }
					]
				: [{ key: other, words: `In ${other}`, text: exact }];
		});
		return computed({
			lines,
			working: others.map((other) => stepTo(read.value, other)),
			drawing: { kind: 'dual-scale', ...scalesOf(dimension, value, unit, main) }
		});
	}
});

function quantityIn(typed: string, degrees: 'reading' | 'difference'): Outcome<Measured> {
	const found = parseAny(typed);
	if (!found.ok || degrees === 'reading' || found.value.dimension !== 'temperature') return found;
	const difference = parseQuantity(typed, 'temperatureDifference');
	return difference.ok
		? computed({ ...difference.value, dimension: 'temperatureDifference' })
		: difference;
}

function stepTo({ dimension, value, unit }: Measured, other: string): Step {
	const [a, b] = [scaleOf(dimension, unit), scaleOf(dimension, other)];
	const zero = a.offset - b.offset;
	const shift = zero === 0 ? '' : ` ${zero < 0 ? '−' : '+'} ${significant(Math.abs(zero))}`;
	const above = `${significant(value)} · ${significant(a.factor)}${shift}`;
	return {
		words: `To ${other}`,
		rule: zero === 0 ? 'x · f(from) / f(to)' : '(x · f(from) + z(from) − z(to)) / f(to)',
		formula: `${shift ? `(${above})` : above} / ${significant(b.factor)} = ${significant(convert(dimension, value, unit as never, other as never))} ${other}`
	};
}
