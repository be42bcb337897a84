import { calculator } from '../calculator';
import { list, quantity } from '../field';
import { diameters, length, limit, size, uncertaintyOf } from './bores/faces';
import { gridPresets } from './bores/grid-presets';
import { gridWorked } from './bores/grid-worked';

/** A cylinder bore from its readings: form, wear, next oversize. */
export const bore = calculator({
	key: 'bore',
	title: 'A cylinder bore',
	says: 'Out-of-round, taper, shape and wear of a bore from its readings, and the next oversize that it cleans up to.',
	drawer: 'bores',
	caution:
		'Wipe and cool the block first, and set the gauge before and after: a bore gauge that slipped spoils every reading. Find the oversize pistons before you bore, one oversize serves all cylinders of most engines.',
	formulas: [
		'geometry/out-of-round',
		'geometry/taper',
		'geometry/shape',
		'geometry/wear',
		'geometry/next-size',
		'geometry/of-weighted-readings',
		'measurement/ruling'
	],
	sources: [
		'Where to read: below the ring ridge, at the middle and at the bottom of the ring travel, in two planes. Common practice, no source.'
	],
	fields: {
		readings: diameters({
			words: 'Readings',
			hint: 'From the top of the ring travel down. Plane 1 square to the piston pin, plane 2 along it.',
			example: '74.052_74.028*74.041_74.024*74.026_74.019'
		}),
		nominal: quantity({ ...size, words: 'Standard size', optional: true, example: '74' }),
		printed: quantity({
			...size,
			words: 'Printed most, to build',
			hint: 'Wear is counted from it.',
			optional: true,
			example: '74.02'
		}),
		wearLimit: quantity({
			...size,
			words: 'Wear limit of the bore',
			optional: true,
			example: '74.1'
		}),
		outOfRoundMost: limit('Most out-of-round, to run again', '0.04'),
		taperMost: limit('Most taper, to run again', '0.05'),
		steps: list({
			...length,
			words: 'Listed oversizes',
			hint: 'Of the pistons that can be had.',
			optional: true,
			example: '0.25; 0.5; 0.75'
		}),
		stock: limit(
			'Least to take off, in diameter',
			'0.05',
			'What boring and honing need to clean up.'
		),
		uncertainty: uncertaintyOf('Uncertainty of one reading', '0.004')
	},
	work: (given) => gridWorked('bore', given),
	presets: (sheet) => gridPresets('bore', sheet)
});
