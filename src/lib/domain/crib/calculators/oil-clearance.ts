import { oilClearance as clearanceOf } from '$lib/kernel/geometry/oil-clearance';
import { leastMm, mostMm } from '$lib/kernel/geometry/diameter-grid';
import { computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { grid } from '../field';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const figure = (valueMm: number) => valueMm.toFixed(3);

/** Bearing bore less pin, least, most and mean over the readings of both. */
export const oilClearance = calculator({
	key: 'oil-clearance',
	title: 'Oil clearance',
	says: 'The least, most and mean clearance of a plain bearing, from the readings of bore and pin.',
	drawer: 'bores',
	caution:
		'Measure the bore with its shells in and the cap tightened through every stage, square to the split. A bearing that is built too tight seizes, one that is too loose loses its oil film.',
	formulas: ['geometry/oil-clearance'],
	fields: {
		bore: grid({
			...length,
			words: 'Bearing bore',
			hint: 'Shells in, cap tightened, square to the split.',
			row: 'Depth',
			column: 'Plane',
			rows: { from: 2, least: 1, most: 12 },
			columns: { from: 2, least: 1, most: 12 },
			example: '40.024_40.026*40.023_40.025'
		}),
		pin: grid({
			...length,
			words: 'Pin',
			row: 'Depth',
			column: 'Plane',
			rows: { from: 2, least: 1, most: 12 },
			columns: { from: 2, least: 1, most: 12 },
			example: '39.992_39.988*39.990_39.986'
		})
	},
	work({ bore, pin }) {
		const found = clearanceOf(bore, pin);
		if (!found.ok) return found;
		const [boreLeast, boreMost] = [leastMm(bore), mostMm(bore)];
		const [pinLeast, pinMost] = [leastMm(pin), mostMm(pin)];
		if (!boreLeast.ok) return boreLeast;
		if (!boreMost.ok) return boreMost;
		if (!pinLeast.ok) return pinLeast;
		if (!pinMost.ok) return pinMost;
		const { leastMm: least, mostMm: most, meanMm: mean } = found.value;
		const mm = { unit: 'mm', decimals: 3 };
		return computed({
			lines: [
				{ key: 'least', words: 'Least clearance', value: least, ...mm, main: true },
				{ key: 'most', words: 'Most clearance', value: most, ...mm, main: true },
				{ key: 'mean', words: 'Mean clearance', value: mean, ...mm }
			],
			working: [
				{
					words: 'Least: smallest bore less largest pin',
					rule: 'least = smallest bore − largest pin',
					formula: `${figure(boreLeast.value)} − ${figure(pinMost.value)}`,
					value: least,
					...mm
				},
				{
					words: 'Most: largest bore less smallest pin',
					rule: 'most = largest bore − smallest pin',
					formula: `${figure(boreMost.value)} − ${figure(pinLeast.value)}`,
					value: most,
					...mm
				}
			],
			drawing: {
				kind: 'clearance',
				boreMm: boreMost.value,
				pinMm: pinLeast.value,
				leastMm: least,
				mostMm: most,
				decimals: 3
			}
		});
	}
});
