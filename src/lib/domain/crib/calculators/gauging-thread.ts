import { onScaleMm, threadClearance, type ScaleMark } from '$lib/kernel/geometry/gauging-thread';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { choice, list, table, type TableRow } from '../field';
import { clearancePresets } from './bores/clearance-presets';
import { fine, length, mm, uncertaintyOf } from './bores/faces';
import { limitFields } from './bores/limit-fields';
import { scaleStep } from './bores/scale-step';
import { ruledBothEnds } from './bores/two-sided';
import { figure } from './formula-figures';

/** Oil clearance from a flattened gauging thread, by the scale of its own pack. */
export const gaugingThread = calculator({
	key: 'gauging-thread',
	title: 'Gauging thread',
	says: 'The oil clearance and its taper from a gauging thread pressed flat between pin and shell.',
	drawer: 'bores',
	caution:
		'Dry pin and shell, lay the thread along the pin away from the oil hole, tighten through every stage and do not turn the shaft: a turned shaft smears the thread and it reads too tight. Take every trace of it off before you build.',
	formulas: ['geometry/gauging-thread', 'geometry/on-scale', 'measurement/ruling'],
	fields: {
		how: choice({
			words: 'What you read',
			options: [
				{ value: 'clearances', words: 'Clearances printed on the pack’s scale' },
				{ value: 'widths', words: 'Widths of the flattened thread' }
			],
			initial: 'clearances',
			example: 'clearances'
		}),
		reads: list({
			...length,
			words: 'Read along the thread',
			hint: 'From one end to the other, three places or more.',
			example: '0.038; 0.044; 0.051'
		}),
		scale: table({
			...length,
			words: 'Scale of the pack',
			hint: 'Only for widths: each mark of that very pack.',
			row: 'Mark',
			columns: [
				{ key: 'width', words: 'Width', of: 'quantity' },
				{ key: 'clearance', words: 'Clearance', of: 'quantity' }
			],
			rows: { from: 2, least: 2, most: 12 },
			optional: true,
			example: ''
		}),
		...limitFields('clearance', { buildLeast: '0.02', buildMost: '0.048', runMost: '0.07' }),
		uncertainty: uncertaintyOf('Uncertainty of one reading', '0.006')
	},
	work({ how, reads, scale, uncertainty, ...limits }) {
		const read =
			how === 'widths' ? byScale(reads, scale ?? []) : computed({ values: reads, steps: [] });
		if (!read.ok) return read;
		const { values, steps } = read.value;
		const found = threadClearance(values);
		if (!found.ok) return found;
		const { leastMm: least, mostMm: most, meanMm: mean, taperMm: taper } = found.value;
		const rulings = ruledBothEnds('Clearance', found.value, uncertainty, limits);
		if (!rulings.ok) return rulings;
		return computed({
			lines: [
				{ key: 'mean', words: 'Mean clearance', value: mean, ...fine, main: true },
				{ key: 'taper', words: 'Taper along the thread', value: taper, ...mm, main: true },
				{ key: 'least', words: 'Least clearance, where it is widest', value: least, ...mm },
				{ key: 'most', words: 'Most clearance, where it is narrowest', value: most, ...mm }
			],
			working: [
				...steps,
				{
					words: 'Mean of what was read',
					rule: 'Σ c / n',
					formula: `(${values.map((one) => figure(one)).join(' + ')}) / ${values.length}`,
					value: mean,
					...fine
				},
				{
					words: 'Taper: largest less smallest',
					rule: 'largest − smallest',
					formula: `${figure(most)} − ${figure(least)}`,
					value: taper,
					...mm
				}
			],
			rulings: rulings.value,
			notes: [
				'One thread says nothing of the plane that it was not laid in. A pin out of round needs a second thread, or a micrometer.'
			],
			drawing: {
				kind: 'gauging-thread',
				places: values.map((clearanceMm, at) => {
					const widthMm = how === 'widths' ? reads[at] : undefined;
					return { clearanceMm, ...(widthMm === undefined ? {} : { widthMm }) };
				}),
				leastMm: least,
				mostMm: most
			}
		});
	},
	presets: (sheet) => clearancePresets(sheet, /oilClearance$/i)
});

function byScale(
	widths: readonly number[],
	rows: readonly TableRow[]
): Outcome<{ values: number[]; steps: Step[] }> {
	if (rows.length === 0) return cannot('type the marks of the pack’s scale to read widths by');
	const scale = rows.map(({ width, clearance }): ScaleMark => ({
		widthMm: typeof width === 'number' ? width : 0,
		clearanceMm: typeof clearance === 'number' ? clearance : 0
	}));
	const values: number[] = [];
	const steps: Step[] = [];
	for (const [at, widthMm] of widths.entries()) {
		const found = onScaleMm(scale, widthMm);
		if (!found.ok) return cannot(`place ${at + 1}: ${found.because}`);
		values.push(found.value);
		steps.push(scaleStep(`Place ${at + 1}`, scale, widthMm, found.value));
	}
	return computed({ values, steps });
}
