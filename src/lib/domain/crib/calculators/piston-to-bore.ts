import { fitCalculator } from './bores/fit-calculator';

/** Bore less skirt, at the height that the maker states. */
export const pistonToBore = fitCalculator({
	key: 'piston-to-bore',
	title: 'Piston to bore',
	says: 'The least and most clearance between a piston’s skirt and its bore, from readings of both.',
	caution:
		'Measure the skirt at the height that the maker states and square to the pin: a skirt is oval and barrelled, and any other place gives another clearance. Let both lie side by side first, aluminium grows twice as fast as iron.',
	sketch: 'piston',
	outer: {
		words: 'Bore readings',
		hint: 'Square to the pin, from top to bottom of the skirt’s travel.',
		example: '74.026; 74.031; 74.022',
		short: 'bore',
		u: '0.004'
	},
	inner: {
		words: 'Skirt readings',
		hint: 'Square to the pin, at the stated height.',
		example: '73.966; 73.964',
		short: 'skirt',
		u: '0.002'
	},
	limits: { buildLeast: '0.025', buildMost: '0.06', runMost: '0.11' },
	keys: /piston\.clearance$/i
});
