import { nutFactors, type NutFactorRange } from '$lib/kernel/fasteners/nut-factor';
import { strengthNames, type StrengthName } from '$lib/kernel/fasteners/strength';
import { choice, number, quantity } from '../../field';

export const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const torqueUnits = {
	dimension: 'torque',
	unit: { metric: 'N·m', inch: 'lbf·ft' },
	decimals: 1,
	least: 0.01,
	most: 20_000
} as const;
const forceUnits = {
	dimension: 'force',
	unit: { metric: 'kN', inch: 'lbf' },
	decimals: 1,
	least: 0.01,
	most: 5000
} as const;

/** A bolt by its thread and its strength, in whichever series it is. */
export const boltFields = {
	diameter: quantity({
		...length,
		words: 'Thread, nominal diameter',
		hint: '10 for an M10; 1/2 in for a half-inch bolt.',
		decimals: 2,
		least: 1,
		most: 200,
		example: '10'
	}),
	pitch: quantity({
		...length,
		words: 'Pitch of a metric thread',
		hint: 'From crest to crest, as a thread gauge shows it. Left out, the coarse pitch of the size is taken.',
		decimals: 2,
		least: 0.2,
		most: 12,
		optional: true,
		example: '1.25'
	}),
	threads: number({
		words: 'Threads per inch of a unified thread',
		hint: 'In place of the pitch.',
		least: 2,
		most: 80,
		optional: true,
		example: ''
	}),
	propertyClass: choice({
		words: 'Property class or grade, as the head is marked',
		options: strengthNames.map((value) => ({ value, words: strengthWords(value) })),
		example: '10.9'
	})
};

export function strengthWords(name: StrengthName): string {
	return name.startsWith('SAE') ? name.replace('SAE', 'SAE grade') : `Class ${name}`;
}

const figures = (of: (range: NutFactorRange) => number) =>
	`Engine oil ${of(nutFactors.oiled).toFixed(2)}, anti-seize ${of(nutFactors['anti-seize']).toFixed(2)}, dry ${of(nutFactors.dry).toFixed(2)}.`;

/** The range that a nut factor lies in, as its lubrication is known. */
export const factorFields = {
	leastFactor: number({
		words: 'Nut factor K, least',
		hint: figures(({ least }) => least),
		least: 0.03,
		most: 0.6,
		example: '0.15'
	}),
	mostFactor: number({
		words: 'Nut factor K, most',
		hint: figures(({ most }) => most),
		least: 0.03,
		most: 0.6,
		example: '0.20'
	})
};
export const factorSource =
	'Nut factors of textbooks and supplier tables: dry steel 0.20 to 0.25, as received 0.20, zinc plated 0.20 to 0.22, engine oil 0.15 to 0.20, anti-seize compound 0.12 to 0.16, waxed about 0.10. They differ between sources.';

/** A torque, or the preload that is wanted of it. */
export const loadFields = (torqueExample: string) => ({
	torque: quantity({
		...torqueUnits,
		words: 'Torque',
		hint: 'Fill in this, or the wanted preload.',
		optional: true,
		example: torqueExample
	}),
	wanted: quantity({ ...forceUnits, words: 'Wanted preload', optional: true, example: '' })
});

export const snugTorque = quantity({ ...torqueUnits, words: 'Snug torque', example: '30' });
export const wantedLoad = quantity({
	...forceUnits,
	words: 'Wanted preload below yield',
	hint: 'With it the angle is found that gives it.',
	optional: true,
	example: ''
});

/** A friction coefficient. */
export const coefficient = { least: 0, most: 1 } as const;
