import { ringGapGrowthMm, ringGapInMm } from '$lib/kernel/geometry/end-play';
import { cannot, computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { quantity } from '../field';
import { clearancePresets } from './bores/clearance-presets';
import { length, mm, size, uncertaintyOf } from './bores/faces';
import { limitFields } from './bores/limit-fields';
import { limitsOf, ruledBetween } from './bores/ruled-between';
import { bracketed, figure } from './formula-figures';

/** A ring's end gap where it was measured and where its bore is widest. */
export const ringGap = calculator({
	key: 'ring-gap',
	title: 'Ring end gap',
	says: 'How wide a piston ring’s gap stands, where it was measured and in the widest part of its bore.',
	drawer: 'bores',
	caution:
		'Push the ring in with a piston so that it lies square, and measure it in the unworn bottom of the bore. A gap that is too small closes when hot: the ring ends butt and break the land or score the bore.',
	formulas: ['geometry/ring-gap-growth', 'geometry/ring-gap-in', 'measurement/ruling'],
	fields: {
		gap: quantity({
			...length,
			words: 'Gap as measured',
			hint: 'By feeler, the ring square in the bore.',
			decimals: 2,
			least: 0,
			most: 50,
			example: '0.32'
		}),
		bore: quantity({
			...size,
			words: 'Bore where it was measured',
			optional: true,
			example: '74.012'
		}),
		widest: quantity({
			...size,
			words: 'Bore at its widest, in the ring travel',
			optional: true,
			example: '74.062'
		}),
		...limitFields('gap', { buildLeast: '0.2', buildMost: '0.35', runMost: '0.8' }),
		uncertainty: uncertaintyOf('Uncertainty of the gap', '0.015')
	},
	work({ gap, bore, widest, buildLeast, buildMost, runMost, uncertainty }) {
		if (widest !== undefined && bore === undefined)
			return cannot('type the bore where the gap was measured too');
		const grown = bore !== undefined && widest !== undefined;
		const wider = grown ? widest - bore : 0;
		const growth = ringGapGrowthMm(wider);
		if (!growth.ok) return growth;
		const there = ringGapInMm(gap, wider);
		if (!there.ok) return there;
		const rulings = ruledBetween([
			{
				of: 'Gap as measured',
				valueMm: gap,
				expandedMm: uncertainty,
				build: limitsOf(buildLeast, buildMost)
			},
			{
				of: grown ? 'Gap at the widest' : 'Gap as measured',
				valueMm: there.value,
				expandedMm: uncertainty,
				'run-again': limitsOf(undefined, runMost)
			}
		]);
		if (!rulings.ok) return rulings;
		return computed({
			lines: [
				{ key: 'gap', words: 'Gap as measured', value: gap, ...mm, main: !grown },
				...(grown
					? [
							{ key: 'growth', words: 'It opens by', value: growth.value, ...mm },
							{
								key: 'there',
								words: 'Gap where the bore is widest',
								value: there.value,
								...mm,
								main: true
							}
						]
					: [])
			],
			working: grown
				? [
						{
							words: 'The circumference grows by π times the diameter’s growth',
							rule: 'Δg = π · (D2 − D1)',
							formula: `π · (${figure(widest)} − ${figure(bore)})`,
							value: growth.value,
							...mm
						},
						{
							words: 'Gap there',
							rule: 'g = g0 + Δg',
							formula: `${figure(gap)} + ${bracketed(growth.value)}`,
							value: there.value,
							...mm
						}
					]
				: [{ words: 'As measured: no other bore is given', value: gap, ...mm }],
			rulings: rulings.value,
			notes: [
				'To build, the gap is judged where it was measured. To run again, where the bore is widest, since that is the gap that leaks.'
			],
			drawing: {
				kind: 'ring-gap',
				gapMm: gap,
				...(bore === undefined ? {} : { boreMm: bore }),
				...(grown ? { widest: { gapMm: there.value, boreMm: widest } } : {})
			}
		});
	},
	presets: (sheet) => clearancePresets(sheet, /ring\.\w*gap$/i)
});
