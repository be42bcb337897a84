import { fitCalculator } from './bores/fit-calculator';

/** Groove less ring, up and down. */
export const ringSideClearance = fitCalculator({
	key: 'ring-side-clearance',
	title: 'Ring side clearance',
	says: 'How much room a piston ring has up and down in its groove, from readings of both.',
	caution:
		'Clean the groove of carbon to its corners, and never with a tool that cuts: a nick in the lower side lets gas past every ring. Use a new ring to judge a groove, a worn one hides its wear.',
	sketch: 'ring',
	outer: {
		words: 'Groove readings',
		hint: 'Height of the groove at several places around the piston.',
		example: '1.242; 1.248; 1.245',
		short: 'groove',
		u: '0.004'
	},
	inner: {
		words: 'Ring readings',
		hint: 'Height of the ring at several places.',
		example: '1.190; 1.188',
		short: 'ring',
		u: '0.002'
	},
	limits: { buildLeast: '0.03', buildMost: '0.07', runMost: '0.12' },
	keys: /ring\.\w*sideClearance$/i,
	notes: [
		'With a feeler between ring and groove the clearance is read at once; the thickest that slides all the way around is the least.'
	]
});
