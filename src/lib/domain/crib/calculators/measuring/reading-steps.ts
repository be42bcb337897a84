import type { Component } from '$lib/kernel/measurement/component';
import type { ReadingAsked, ReadingFound } from '$lib/kernel/measurement/reading';
import type { UncertainBody } from '$lib/kernel/measurement/sources-of-uncertainty';
import { coverageFactor } from '$lib/kernel/measurement/uncertainty';
import type { Step } from '../../../working';
import { placesFor, printed } from './printed';

/** Every step from the readings to U, so that a person could redo it by hand. */
export function readingSteps(asked: ReadingAsked, found: ReadingFound): Step[] {
	const { budget } = found;
	const places = placesFor(budget.expanded);
	const fine = places + 2;
	const mm = (value: number, decimals = fine) => ({ value, unit: 'mm', decimals });
	const parts = budget.lines.map(({ contribution }) => printed(contribution, fine));
	return [
		...repeatSteps(asked, found, places),
		...correctionStep(asked, found, places),
		...budget.lines
			.filter(({ type }) => type === 'B')
			.map((line) => ({
				words: line.name,
				...ruleOf(line, asked, found.meanMm),
				...mm(line.contribution)
			})),
		{
			words: 'All of them together',
			rule: 'u = √(Σ uᵢ²)',
			formula: `√(${parts.map((one) => `${one}²`).join(' + ')})`,
			...mm(budget.standard)
		},
		...(Number.isFinite(budget.degreesOfFreedom)
			? [
					{
						words: 'How well that is known: effective degrees of freedom',
						rule: 'ν = u⁴ / Σ (uᵢ⁴ / νᵢ)',
						formula: `${printed(budget.standard, fine)}⁴ / (${budget.lines
							.filter((line) => Number.isFinite(line.degreesOfFreedom))
							.map((line) => `${printed(line.contribution, fine)}⁴ / ${line.degreesOfFreedom}`)
							.join(' + ')})`,
						value: budget.degreesOfFreedom,
						unit: '',
						decimals: 1
					}
				]
			: []),
		{
			words: 'Coverage factor for 95 %: Student’s t for ν cut to a whole number, never below 2',
			rule: 'k = t(97.5 %, ⌊ν⌋), at least 2',
			formula: tFor(budget.degreesOfFreedom),
			value: budget.coverageFactor,
			unit: '',
			decimals: 3
		},
		{
			words: 'Expanded uncertainty',
			rule: 'U = k · u',
			formula: `${printed(budget.coverageFactor, 3)} · ${printed(budget.standard, fine)}`,
			...mm(budget.expanded, places)
		}
	];
}

function tFor(degrees: number): string {
	return Number.isFinite(degrees) ? `t(97.5 %, ${Math.floor(degrees)})` : 't(97.5 %, ∞), so 2';
}

function repeatSteps(
	{ readingsMm }: ReadingAsked,
	{ meanMm, repeats }: ReadingFound,
	places: number
): Step[] {
	if (!repeats) return [];
	const n = readingsMm.length;
	const fine = places + 2;
	const off = readingsMm.map((one) => `(${printed(one - meanMm, fine)})²`);
	return [
		{
			words: 'Mean of the readings',
			rule: 'x̄ = Σ x / n',
			formula: `(${readingsMm.map((one) => printed(one, places)).join(' + ')}) / ${n}`,
			value: meanMm,
			unit: 'mm',
			decimals: places
		},
		{
			words: 'Scatter of one reading',
			rule: 's = √(Σ (x − x̄)² / (n − 1))',
			formula: `√((${off.join(' + ')}) / ${n - 1})`,
			value: repeats.deviation,
			unit: 'mm',
			decimals: fine
		},
		{
			words: 'Scatter of their mean',
			rule: 'u = s / √n',
			formula: `${printed(repeats.deviation, fine)} / √${n}`,
			value: repeats.standard,
			unit: 'mm',
			decimals: fine
		}
	];
}

function correctionStep({ bodies }: ReadingAsked, found: ReadingFound, places: number): Step[] {
	if (!bodies) return [];
	const { part, instrument } = bodies;
	const term = ({ expansionPerK, temperatureC }: UncertainBody) =>
		`${micro(expansionPerK)} · (${printed(temperatureC, 1)} − 20)`;
	return [
		{
			words: 'Brought to 20 °C, part minus instrument',
			rule: 'L20 = L · (1 + αs · (Ts − 20) − αp · (Tp − 20))',
			formula: `${printed(found.meanMm, places)} · (1 + ${term(instrument)} − ${term(part)})`,
			value: found.valueMm,
			unit: 'mm',
			decimals: places
		}
	];
}

function ruleOf(
	{ name, sensitivity, standard }: Component,
	{ leastCountMm, calibrationMm, bodies }: ReadingAsked,
	meanMm: number
): Pick<Step, 'rule' | 'formula'> {
	if (name === 'Least count') return { rule: 'u = δ / √12', formula: `${leastCountMm} / √12` };
	if (name === 'Calibration')
		return { rule: 'u = U / 2', formula: `${calibrationMm} / ${coverageFactor}` };
	const body = /part$/.test(name) ? bodies?.part : bodies?.instrument;
	if (!body) return { rule: 'u = |c| · u', formula: `${Math.abs(sensitivity)} · ${standard}` };
	const size = printed(meanMm, 3);
	return /^Temperature/.test(name)
		? {
				rule: 'u = L · α · a / √3',
				formula: `${size} · ${micro(body.expansionPerK)} · ${body.temperatureWithinC} / √3`
			}
		: {
				rule: 'u = L · |T − 20| · a / √3',
				formula: `${size} · ${printed(Math.abs(body.temperatureC - 20), 1)} · ${micro(body.expansionWithinPerK)} / √3`
			};
}

/** An expansion as tables print it: 11.5·10⁻⁶. */
function micro(perK: number): string {
	return `${Number((perK * 1e6).toPrecision(4))}·10⁻⁶`;
}
