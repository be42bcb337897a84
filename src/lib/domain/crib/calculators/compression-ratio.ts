import {
	compressionRatio as ratioFrom,
	solvePart,
	type SolvedPart
} from '$lib/kernel/cylinder/compression-ratio';
import { cannot, computed } from '$lib/kernel/outcome';
import { dimensionOf } from '../../data-sheets/value-of';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { choice, number, quantity } from '../field';
import type { ResultLine } from '../worked';
import { bracketed, figure } from './formula-figures';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const volume = { dimension: 'volume', unit: { metric: 'cm³', inch: 'in³' }, decimals: 1 } as const;
const solved: Record<SolvedPart, { words: string; unit: string; decimals: number }> = {
	chamberCm3: { words: 'Chamber for the wanted ratio', unit: 'cm³', decimals: 2 },
	gasketMm: { words: 'Gasket for the wanted ratio', unit: 'mm', decimals: 3 },
	deckMm: { words: 'Piston below the deck for the wanted ratio', unit: 'mm', decimals: 3 },
	crownCm3: { words: 'Dish (below zero: dome) for the wanted ratio', unit: 'cm³', decimals: 2 }
};

/** Compression ratio from the parts above a piston, and each part for a wanted ratio. */
export const compressionRatio = calculator({
	key: 'compression-ratio',
	title: 'Compression ratio',
	says: 'Compression ratio from chamber, gasket, deck and crown, and any one of them solved for the ratio that is wanted.',
	drawer: 'cylinder',
	caution:
		'A ratio above the maker’s knocks on the fuel that he wrote it for. After skimming, valves and pistons come closer: measure that too.',
	formulas: [
		'cylinder/displacement',
		'cylinder/disc-volume',
		'cylinder/compression-ratio',
		'cylinder/solve-part'
	],
	fields: {
		bore: quantity({ ...length, words: 'Bore', decimals: 2, least: 5, most: 2000, example: '74' }),
		stroke: quantity({
			...length,
			words: 'Stroke',
			decimals: 2,
			least: 5,
			most: 3000,
			example: '89.1'
		}),
		chamber: quantity({
			...volume,
			words: 'Chamber in the head',
			least: 0,
			most: 50_000,
			example: '32'
		}),
		gasketBore: quantity({
			...length,
			words: 'Gasket, bore',
			decimals: 2,
			least: 5,
			most: 2000,
			example: '75'
		}),
		gasket: quantity({
			...length,
			words: 'Gasket, fitted thickness',
			decimals: 2,
			least: 0,
			most: 20,
			example: '1.2'
		}),
		deck: quantity({
			...length,
			words: 'Piston below the deck',
			hint: 'Below zero where it stands proud.',
			decimals: 2,
			least: -20,
			most: 50,
			example: '0.2'
		}),
		crown: quantity({
			...volume,
			words: 'Dish and reliefs in the crown',
			hint: 'Below zero for a dome.',
			least: -5000,
			most: 5000,
			example: '5.4'
		}),
		wanted: number({
			words: 'Wanted ratio',
			hint: 'With it, one part is solved.',
			least: 1.5,
			most: 40,
			optional: true,
			example: '10.2'
		}),
		part: choice({
			words: 'Part to solve',
			options: [
				{ value: 'chamberCm3', words: 'Chamber' },
				{ value: 'gasketMm', words: 'Gasket thickness' },
				{ value: 'deckMm', words: 'Deck' },
				{ value: 'crownCm3', words: 'Crown' }
			],
			example: 'gasketMm',
			initial: 'gasketMm'
		})
	},
	work({ bore, stroke, chamber, gasketBore, gasket, deck, crown, wanted, part }) {
		const cylinder = { boreMm: bore, strokeMm: stroke };
		const parts = {
			chamberCm3: chamber,
			gasketBoreMm: gasketBore,
			gasketMm: gasket,
			deckMm: deck,
			crownCm3: crown
		};
		const found = ratioFrom(cylinder, parts);
		if (!found.ok) return found;
		const { ratio, sweptCm3, clearanceCm3, gasketCm3, deckCm3 } = found.value;
		const cm3 = { unit: 'cm³', decimals: 2 };
		const lines: ResultLine[] = [
			{
				key: 'ratio',
				words: 'Compression ratio, to 1',
				value: ratio,
				unit: '',
				decimals: 2,
				main: true
			},
			{ key: 'swept', words: 'Swept volume', value: sweptCm3, unit: 'cm³', decimals: 1 },
			{ key: 'clearance', words: 'Clearance volume', value: clearanceCm3, ...cm3 }
		];
		const working: Step[] = [
			{
				words: 'Swept volume',
				rule: 'Vs = π/4 · B² · S',
				formula: `π/4 · ${figure(bore / 10)}² · ${figure(stroke / 10)}`,
				value: sweptCm3,
				unit: 'cm³',
				decimals: 1
			},
			{
				words: 'Gasket',
				rule: 'V = π/4 · D² · h',
				formula: `π/4 · ${figure(gasketBore / 10)}² · ${figure(gasket / 10)}`,
				value: gasketCm3,
				...cm3
			},
			{
				words: 'Deck',
				rule: 'V = π/4 · B² · h',
				formula: `π/4 · ${figure(bore / 10)}² · ${bracketed(deck / 10)}`,
				value: deckCm3,
				...cm3
			},
			{
				words: 'Clearance volume',
				rule: 'Vc = chamber + gasket + deck + crown',
				formula: [chamber, gasketCm3, deckCm3, crown].map((one) => bracketed(one, 2)).join(' + '),
				value: clearanceCm3,
				...cm3
			},
			{
				words: 'Ratio',
				rule: 'ε = (Vs + Vc) / Vc',
				formula: `(${figure(sweptCm3, 1)} + ${figure(clearanceCm3, 2)}) / ${figure(clearanceCm3, 2)}`,
				value: ratio,
				unit: '',
				decimals: 2
			}
		];
		if (wanted !== undefined) {
			const answer = solvePart(cylinder, parts, part, wanted);
			if (!answer.ok) return cannot(`for ${wanted} to 1: ${answer.because}`);
			const { words, unit, decimals } = solved[part];
			lines.push({ key: 'solved', words, value: answer.value, unit, decimals, main: true });
			working.push({
				words: `${words}: what is left of the clearance volume for ${wanted} to 1`,
				rule: 'Vs / (ε − 1) − all the others',
				formula: `${figure(sweptCm3, 1)} / (${wanted} − 1) − the others`,
				value: answer.value,
				unit,
				decimals
			});
		}
		return computed({
			lines,
			working,
			drawing: {
				kind: 'cylinder-volumes',
				boreMm: bore,
				strokeMm: stroke,
				sweptCm3,
				parts: [
					{ words: 'chamber', cm3: chamber },
					{ words: 'gasket', cm3: gasketCm3 },
					{ words: 'deck', cm3: deckCm3 },
					{ words: crown < 0 ? 'dome' : 'dish', cm3: crown }
				]
			}
		});
	},
	presets: (sheet) => {
		const nominal = (key: string) => {
			const found = dimensionOf(sheet, key);
			const value =
				found?.nominal ?? (found?.build ? (found.build.least + found.build.most) / 2 : undefined);
			return value === undefined ? undefined : String(Number(value.toFixed(4)));
		};
		const [bore, stroke] = [nominal('cylinder.bore'), nominal('crankshaft.stroke')];
		if (!bore || !stroke) return [];
		const values = {
			bore,
			stroke,
			chamber: nominal('head.chamberVolume') ?? '',
			gasket: nominal('head.gasketThickness') ?? '',
			crown: nominal('piston.dish') ?? nominal('piston.bowl') ?? ''
		};
		return [{ key: 'cylinder.bore', words: 'One cylinder, middle of the printed sizes', values }];
	}
});
