import type { SolvedPart } from '$lib/kernel/cylinder/solve-part';
import { choice, number, quantity } from '../../field';
import { boreRange, length, strokeRange, volume } from './faces';

/** What a person measures above a piston, from the head down. */
export const ratioFields = {
	bore: quantity({ ...length, ...boreRange, words: 'Bore', example: '74' }),
	stroke: quantity({ ...length, ...strokeRange, words: 'Stroke', example: '89.1' }),
	chamber: quantity({
		...volume,
		words: 'Chamber in the head',
		hint: 'By burette through a plate on the face, plug and valves in. A flat head has none: 0.',
		least: 0,
		most: 50_000,
		example: '32'
	}),
	cut: quantity({
		...length,
		words: 'Skimmed off since',
		least: 0,
		most: 20,
		optional: true,
		example: ''
	}),
	opening: number({
		words: 'Chamber’s opening at the face, cm²',
		hint: 'Only for a skim: trace the edge on millimetre paper and count.',
		least: 0.1,
		most: 20_000,
		optional: true,
		example: ''
	}),
	gasketBore: quantity({ ...length, ...boreRange, words: 'Gasket, bore', example: '75' }),
	gasket: quantity({
		...length,
		words: 'Gasket, fitted thickness',
		least: 0,
		most: 20,
		example: '1.2'
	}),
	deck: quantity({
		...length,
		words: 'Piston below the deck',
		hint: 'At top dead centre. Below zero where it stands proud.',
		least: -20,
		most: 50,
		example: '0.2'
	}),
	crown: quantity({
		...volume,
		words: 'Dish, bowl and reliefs in the crown',
		hint: 'Below zero for a dome.',
		least: -5000,
		most: 20_000,
		example: '5.4'
	}),
	crevice: quantity({
		...volume,
		words: 'Space above the top ring',
		hint: 'Small; where nobody has measured it, leave it out.',
		least: 0,
		most: 500,
		optional: true,
		example: ''
	}),
	wanted: number({
		words: 'Wanted ratio, to 1',
		hint: 'With it, the part below is solved.',
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
			{ value: 'deckMm', words: 'Piston at the deck' },
			{ value: 'crownCm3', words: 'Crown: dish or dome' }
		],
		initial: 'gasketMm',
		example: 'gasketMm'
	})
};

/** How the part that is solved is called, and in what it is measured. */
export const solvedWords: Record<SolvedPart, { words: string; unit: string; decimals: number }> = {
	chamberCm3: { words: 'Chamber for the wanted ratio', unit: 'cm³', decimals: 2 },
	gasketMm: { words: 'Gasket for the wanted ratio', unit: 'mm', decimals: 3 },
	deckMm: { words: 'Piston below the deck for the wanted ratio', unit: 'mm', decimals: 3 },
	crownCm3: { words: 'Crown for the wanted ratio; below zero, a dome', unit: 'cm³', decimals: 2 }
};
