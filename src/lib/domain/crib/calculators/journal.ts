import { calculator } from '../calculator';
import { list, quantity } from '../field';
import { diameters, length, limit, size, uncertaintyOf } from './bores/faces';
import { gridPresets } from './bores/grid-presets';
import { gridWorked } from './bores/grid-worked';

/** A crankpin or main journal from its readings: form, wear, next undersize. */
export const journal = calculator({
	key: 'journal',
	title: 'A crankpin or journal',
	says: 'Out-of-round, taper, shape and wear of a pin or journal from its readings, and the next undersize that it cleans up to.',
	drawer: 'bores',
	caution:
		'Support the shaft so that it cannot roll. Before anything is ground, look for cracks, bluing and the hardness the maker asks for: a hardened surface that is ground through, or a fillet ground sharp, breaks the shaft.',
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
		'Where to read: two planes at right angles near both ends, away from oil hole and fillets. Common practice, no source.'
	],
	fields: {
		readings: diameters({
			words: 'Readings',
			hint: 'From one fillet to the other, clear of both and of the oil hole. Plane 1 in line with the throw, plane 2 square to it.',
			example: '39.981_39.972*39.978_39.968*39.979_39.971'
		}),
		nominal: quantity({ ...size, words: 'Standard size', optional: true, example: '40' }),
		printed: quantity({
			...size,
			words: 'Printed least, to build',
			hint: 'Wear is counted from it.',
			optional: true,
			example: '39.98'
		}),
		wearLimit: quantity({
			...size,
			words: 'Wear limit of the journal',
			optional: true,
			example: '39.95'
		}),
		outOfRoundMost: limit('Most out-of-round, to run again', '0.008'),
		taperMost: limit('Most taper, to run again', '0.008'),
		steps: list({
			...length,
			words: 'Listed undersizes',
			hint: 'Of the shells that can be had.',
			optional: true,
			example: '0.25; 0.5'
		}),
		stock: limit('Least to take off, in diameter', '0.05', 'What grinding needs to clean up.'),
		uncertainty: uncertaintyOf('Uncertainty of one reading', '0.002')
	},
	work: (given) => gridWorked('journal', given),
	presets: (sheet) => gridPresets('journal', sheet)
});
