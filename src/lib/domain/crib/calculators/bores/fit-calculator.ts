import { leastMm, mostMm } from '$lib/kernel/geometry/diameter-grid';
import { fitOf } from '$lib/kernel/geometry/fit';
import { computed } from '$lib/kernel/outcome';
import type { DataSheet } from '../../../data-sheets/schema';
import { dimensionOf } from '../../../data-sheets/value-of';
import { calculator, type Preset } from '../../calculator';
import type { FitDrawing } from '../../drawings/fit';
import { list } from '../../field';
import { figure } from '../formula-figures';
import { allOf } from '../temperature/all-of';
import { clearancePresets } from './clearance-presets';
import { length, mm, uncertaintyOf } from './faces';
import { limitFields } from './limit-fields';
import { ofBoth } from './of-both';
import { ruledBothEnds } from './two-sided';

type Side = { words: string; hint: string; example: string; short: string; u: string };

/** A page about one part running in another: its words, and what is usual in that job. */
export function fitCalculator(given: {
	key: string;
	title: string;
	says: string;
	caution: string;
	sketch: FitDrawing['sketch'];
	outer: Side;
	inner: Side;
	limits: { buildLeast: string; buildMost: string; runMost: string };
	/** Which clearances of a data sheet the page is for. */
	keys: RegExp;
	notes?: readonly string[];
}) {
	const { outer: out, inner: inn, sketch, keys } = given;
	return calculator({
		key: given.key,
		title: given.title,
		says: given.says,
		drawer: 'bores',
		caution: given.caution,
		formulas: ['geometry/fit', 'measurement/of-difference', 'measurement/ruling'],
		fields: {
			outer: list({ ...length, words: out.words, hint: out.hint, example: out.example }),
			inner: list({ ...length, words: inn.words, hint: inn.hint, example: inn.example }),
			...limitFields('clearance', given.limits),
			outerU: uncertaintyOf(`Uncertainty of a reading of the ${out.short}`, out.u),
			innerU: uncertaintyOf(`Uncertainty of a reading of the ${inn.short}`, inn.u)
		},
		work({ outer, inner, outerU, innerU, ...limits }) {
			const sizes = allOf({
				outerLeast: leastMm([outer]),
				outerMost: mostMm([outer]),
				innerLeast: leastMm([inner]),
				innerMost: mostMm([inner])
			});
			if (!sizes.ok) return sizes;
			const { outerLeast, outerMost, innerLeast, innerMost } = sizes.value;
			const outside = { leastMm: outerLeast, mostMm: outerMost };
			const inside = { leastMm: innerLeast, mostMm: innerMost };
			const found = fitOf(outside, inside);
			if (!found.ok) return found;
			const { leastMm: least, mostMm: most } = found.value;
			const doubt = ofBoth('Clearance', outerU, innerU);
			const rulings = ruledBothEnds('Clearance', found.value, doubt.expandedMm, limits);
			if (!rulings.ok) return rulings;
			return computed({
				lines: [
					{ key: 'least', words: 'Least clearance', value: least, ...mm, main: true },
					{ key: 'most', words: 'Most clearance', value: most, ...mm, main: true }
				],
				working: [
					{
						words: `Least: smallest ${out.short} less largest ${inn.short}`,
						rule: 'least = smallest outer − largest inner',
						formula: `${figure(outerLeast)} − ${figure(innerMost)}`,
						value: least,
						...mm
					},
					{
						words: `Most: largest ${out.short} less smallest ${inn.short}`,
						rule: 'most = largest outer − smallest inner',
						formula: `${figure(outerMost)} − ${figure(innerLeast)}`,
						value: most,
						...mm
					},
					...doubt.steps
				],
				rulings: rulings.value,
				notes: [
					...(least <= 0
						? [
								`Below zero the ${inn.short} is larger than the ${out.short}: it binds there, or one of the two was read wrong.`
							]
						: []),
					...(given.notes ?? [])
				],
				drawing: {
					kind: 'fit',
					sketch,
					outer: { words: out.short, ...outside },
					inner: { words: inn.short, ...inside },
					leastMm: least,
					mostMm: most
				}
			});
		},
		presets: (sheet) => [...clearancePresets(sheet, keys), ...printedSizes(sheet, keys)]
	});
}

/** Where a sheet says which two sizes make the clearance: their printed limits instead of readings. */
function printedSizes(sheet: DataSheet, keys: RegExp): Preset[] {
	return sheet.fits.flatMap(({ clearance, outer, inner }) => {
		const [of, a, b] = [clearance, outer, inner].map((key) => dimensionOf(sheet, key));
		if (!of || !a?.build || !b?.build || !keys.test(clearance)) return [];
		const typed = ({ least, most }: { least: number; most: number }) => `${least}; ${most}`;
		return [
			{
				key: `${clearance}/printed`,
				words: `${of.words}, printed sizes`,
				values: { outer: typed(a.build), inner: typed(b.build) }
			}
		];
	});
}
