import { fitCalculator } from './bores/fit-calculator';

/** Guide less stem. */
export const stemToGuide = fitCalculator({
	key: 'stem-to-guide',
	title: 'Valve stem to guide',
	says: 'The least and most clearance between a valve’s stem and its guide, from readings of both.',
	caution:
		'Compress and release valve springs with a proper tool, in glasses: collets fly. Guides wear bell-mouthed, so read both ends; a stem is read where it ran in the guide, not on its unworn part.',
	sketch: 'stem',
	outer: {
		words: 'Guide readings',
		hint: 'At both ends and in the middle, in two planes.',
		example: '5.512; 5.506; 5.518',
		short: 'guide',
		u: '0.004'
	},
	inner: {
		words: 'Stem readings',
		hint: 'Where it ran in the guide, in two planes.',
		example: '5.471; 5.468',
		short: 'stem',
		u: '0.002'
	},
	limits: { buildLeast: '0.02', buildMost: '0.047', runMost: '0.1' },
	keys: /stemClearance$/i
});
