import { leastMm, mostMm } from '$lib/kernel/geometry/diameter-grid';
import { usualOilClearanceMm } from '$lib/kernel/geometry/fit';
import { oilClearance as clearanceOf } from '$lib/kernel/geometry/oil-clearance';
import { computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { clearancePresets } from './bores/clearance-presets';
import { diameters, fine, mm, uncertaintyOf } from './bores/faces';
import { limitFields } from './bores/limit-fields';
import { ofBoth } from './bores/of-both';
import { ruledBothEnds } from './bores/two-sided';
import { figure } from './formula-figures';
import { allOf } from './temperature/all-of';

/** Bearing bore less pin, least, most and mean over the readings of both. */
export const oilClearance = calculator({
	key: 'oil-clearance',
	title: 'Oil clearance',
	says: 'The least, most and mean clearance of a plain bearing, from the readings of bore and pin.',
	drawer: 'bores',
	caution:
		'Measure the bore with its shells in and the cap tightened through every stage, square to the split. A bearing that is built too tight seizes, one that is too loose loses its oil film.',
	formulas: [
		'geometry/oil-clearance',
		'geometry/usual-oil-clearance',
		'measurement/of-difference',
		'measurement/ruling'
	],
	fields: {
		bore: diameters({
			words: 'Bearing bore',
			hint: 'Shells in, cap tightened, square to the split: near it the shells are thinner.',
			example: '40.024_40.026*40.023_40.025'
		}),
		pin: diameters({
			words: 'Pin',
			hint: 'Two planes at right angles, near both ends.',
			example: '39.992_39.988*39.990_39.986'
		}),
		...limitFields('clearance', { buildLeast: '0.02', buildMost: '0.048', runMost: '0.07' }),
		boreU: uncertaintyOf('Uncertainty of a bore reading', '0.003'),
		pinU: uncertaintyOf('Uncertainty of a pin reading', '0.002')
	},
	work({ bore, pin, boreU, pinU, ...limits }) {
		const found = clearanceOf(bore, pin);
		if (!found.ok) return found;
		const sizes = allOf({
			boreLeast: leastMm(bore),
			boreMost: mostMm(bore),
			pinLeast: leastMm(pin),
			pinMost: mostMm(pin)
		});
		if (!sizes.ok) return sizes;
		const { boreLeast, boreMost, pinLeast, pinMost } = sizes.value;
		const { leastMm: least, mostMm: most, meanMm: mean } = found.value;
		const usual = usualOilClearanceMm(pinMost);
		if (!usual.ok) return usual;
		const doubt = ofBoth('Clearance', boreU, pinU);
		const rulings = ruledBothEnds('Clearance', found.value, doubt.expandedMm, limits);
		if (!rulings.ok) return rulings;
		return computed({
			lines: [
				{ key: 'least', words: 'Least clearance', value: least, ...mm, main: true },
				{ key: 'most', words: 'Most clearance', value: most, ...mm, main: true },
				{ key: 'mean', words: 'Mean clearance', value: mean, ...fine },
				{
					key: 'usual',
					words: 'Rule of thumb, a thousandth of the pin; never a limit',
					value: usual.value,
					...mm
				}
			],
			working: [
				{
					words: 'Least: smallest bore less largest pin',
					rule: 'least = smallest bore − largest pin',
					formula: `${figure(boreLeast)} − ${figure(pinMost)}`,
					value: least,
					...mm
				},
				{
					words: 'Most: largest bore less smallest pin',
					rule: 'most = largest bore − smallest pin',
					formula: `${figure(boreMost)} − ${figure(pinLeast)}`,
					value: most,
					...mm
				},
				{
					words: 'Mean: the mean of all bore readings less the mean of all pin readings',
					rule: 'mean = mean bore − mean pin',
					formula: `${sumOf(bore)} − ${sumOf(pin)}`,
					value: mean,
					...fine
				},
				...doubt.steps
			],
			rulings: rulings.value,
			drawing: {
				kind: 'clearance',
				boreMm: boreMost,
				pinMm: pinLeast,
				leastMm: least,
				mostMm: most,
				decimals: 3
			}
		});
	},
	presets: (sheet) => clearancePresets(sheet, /oilClearance$/i)
});

function sumOf(grid: readonly (readonly (number | null)[])[]): string {
	const all = grid.flat().filter((one) => one !== null);
	return all.length === 1
		? figure(all[0] ?? 0)
		: `(${all.map((one) => figure(one)).join(' + ')}) / ${all.length}`;
}
