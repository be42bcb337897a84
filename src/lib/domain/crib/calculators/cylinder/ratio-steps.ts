import type { ClearanceParts, Cylinder, Ratio } from '$lib/kernel/cylinder/compression-ratio';
import type { Solved, SolvedPart } from '$lib/kernel/cylinder/solve-part';
import type { Step } from '../../../working';
import { bracketed, figure, plain } from '../formula-figures';
import { cm3 } from './faces';
import { solvedWords } from './ratio-fields';

export function skimSteps(before: number, opening: number, cut: number, after: number): Step[] {
	return [
		{
			words: 'Chamber after the skim: what lay between the two faces is gone',
			rule: 'V = V0 − A · c / 10',
			formula: `${plain(before)} − ${plain(opening)} · ${plain(cut)} / 10`,
			value: after,
			...cm3
		}
	];
}

/** Each volume, their sum, and the ratio; lengths stand in cm so that cm³ come out. */
export function ratioSteps(
	{ boreMm, strokeMm }: Cylinder,
	parts: ClearanceParts,
	{ ratio, sweptCm3, clearanceCm3, gasketCm3, deckCm3 }: Ratio
): Step[] {
	const { chamberCm3, crownCm3, creviceCm3, gasketBoreMm, gasketMm, deckMm } = parts;
	const taken = [chamberCm3, gasketCm3, deckCm3, crownCm3, ...(creviceCm3 ? [creviceCm3] : [])];
	return [
		{
			words: 'Swept volume, lengths in cm',
			rule: 'Vs = π/4 · B² · S',
			formula: `π/4 · ${plain(boreMm / 10)}² · ${plain(strokeMm / 10)}`,
			value: sweptCm3,
			...cm3
		},
		{
			words: 'Gasket',
			rule: 'V = π/4 · D² · h',
			formula: `π/4 · ${plain(gasketBoreMm / 10)}² · ${plain(gasketMm / 10)}`,
			value: gasketCm3,
			...cm3
		},
		{
			words: deckMm < 0 ? 'Deck: the piston stands proud and takes room away' : 'Deck',
			rule: 'V = π/4 · B² · h',
			formula: `π/4 · ${plain(boreMm / 10)}² · ${bracketed(deckMm / 10)}`,
			value: deckCm3,
			...cm3
		},
		{
			words: 'Clearance volume: all that is left above the piston',
			rule: `Vc = chamber + gasket + deck + crown${creviceCm3 ? ' + ring land' : ''}`,
			formula: taken.map((one) => bracketed(one, 2)).join(' + '),
			value: clearanceCm3,
			...cm3
		},
		{
			words: 'Ratio',
			rule: 'ε = (Vs + Vc) / Vc',
			formula: `(${figure(sweptCm3, 2)} + ${figure(clearanceCm3, 2)}) / ${figure(clearanceCm3, 2)}`,
			value: ratio,
			unit: '',
			decimals: 2
		}
	];
}

export function solvedSteps(part: SolvedPart, wanted: number, solved: Solved): Step[] {
	const { value, sweptCm3, clearanceCm3, othersCm3, leftCm3, diameterMm } = solved;
	const { words, ...unit } = solvedWords[part];
	return [
		{
			words: `Clearance volume for ${wanted} to 1`,
			rule: 'Vc = Vs / (ε − 1)',
			formula: `${figure(sweptCm3, 2)} / (${wanted} − 1)`,
			value: clearanceCm3,
			...cm3
		},
		{
			words: 'What the other parts leave of it',
			rule: 'left = Vc − all the others',
			formula: `${figure(clearanceCm3, 2)} − ${bracketed(othersCm3, 2)}`,
			value: leftCm3,
			...cm3
		},
		...(diameterMm === undefined
			? []
			: [
					{
						words,
						rule: 'h = V / (π/4 · D²)',
						formula: `${bracketed(leftCm3, 2)} · 1000 / (π/4 · ${plain(diameterMm)}²)`,
						value,
						...unit
					}
				])
	];
}
