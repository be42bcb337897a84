import { guardBandRules } from '$lib/kernel/measurement/guard-band';
import type { Limits, Ruling } from '$lib/kernel/measurement/ruling';
import { coverageFactor } from '$lib/kernel/measurement/uncertainty';
import type { Step } from '../../../working';
import { printed } from './printed';

type Asked = { value: number; expandedUncertainty: number } & Limits;

/** From the uncertainty to the guard band, from there to the ruling, and the probability beside it. */
export function rulingSteps(
	{ value, expandedUncertainty, least, most }: Asked,
	{ rule, guardBand, conformance }: Ruling & { conformance: number },
	decimals: number
): Step[] {
	const mm = (one: number) => ({ value: one, unit: 'mm', decimals });
	const p = (one: number) => printed(one, decimals);
	const u = expandedUncertainty / coverageFactor;
	const over = (limit: number) => `(${p(limit)} − ${p(value)}) / ${printed(u, decimals + 1)}`;
	return [
		{
			words: 'Guard band',
			rule: guardBandRules[rule].says,
			formula: rule === 'full-U' ? p(expandedUncertainty) : `1.645 · ${p(expandedUncertainty)} / 2`,
			...mm(guardBand)
		},
		...(least === undefined
			? []
			: [
					{
						words: `Within from here up, out below ${p(least - guardBand)} mm`,
						rule: 'least + g',
						formula: `${p(least)} + ${p(guardBand)}`,
						...mm(least + guardBand)
					}
				]),
		...(most === undefined
			? []
			: [
					{
						words: `Within down from here, out above ${p(most + guardBand)} mm`,
						rule: 'most − g',
						formula: `${p(most)} − ${p(guardBand)}`,
						...mm(most - guardBand)
					}
				]),
		{ words: 'The reading', ...mm(value) },
		{
			words: 'Standard uncertainty',
			rule: 'u = U / 2',
			formula: `${p(expandedUncertainty)} / 2`,
			value: u,
			unit: 'mm',
			decimals: decimals + 1
		},
		{
			words: 'Probability that the part lies within, Φ being the normal distribution',
			rule: 'p = Φ((most − y) / u) − Φ((least − y) / u)',
			formula:
				u === 0
					? 'known exactly'
					: [
							most === undefined ? '1' : `Φ(${over(most)})`,
							...(least === undefined ? [] : [`Φ(${over(least)})`])
						].join(' − '),
			value: 100 * conformance,
			unit: '%',
			decimals: 2
		}
	];
}
