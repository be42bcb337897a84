import { computed, type Outcome } from '../../outcome';
import type { Formula } from '../../formula';
import { thirdsNm } from '../stage-sequence';
import { ringPattern } from '../pattern-shapes';
import { soundNext, soundNextLoose } from '../sound-next';
import { orderFromMiddle, orderFromOutside } from '../tightening-order';

/** Eight bolts around a flange, named by their place on the turn. */
const flange = Array.from({ length: 8 }, (_, at) => ({
	id: String(at + 1),
	xMm: 100 * Math.cos((at * Math.PI) / 4),
	yMm: 100 * Math.sin((at * Math.PI) / 4)
}));
/** Four in a row, such as the bolts of a narrow cover. */
const row = [1, 2, 3, 4].map((at) => ({ id: String(at), xMm: 50 * at, yMm: 0 }));
const first = (found: Outcome<string[]>, at: number): Outcome<number> =>
	found.ok ? computed(Number(found.value[at])) : found;

/** Orders of tightening where none is printed. */
export const orderFormulas: readonly Formula[] = [
	{
		id: 'fasteners/sound-next',
		works: soundNext,
		formula:
			'flange: largest least distance to the tight ones, then the bolt across; else least distance from the middle',
		source: 'cross pattern of flange practice and centre-outward rule, common practice, no source',
		example: {
			says: 'eight around a flange, the first tight: the next',
			gives: () => first(soundNext(flange, ['1']), 0),
			wanted: 5,
			within: 0.01
		}
	},
	{
		id: 'fasteners/order-from-middle',
		works: orderFromMiddle,
		formula: 'of the sound next bolts the one farthest from the pair tightened last, then by name',
		source: 'common practice, no source; a printed order wins',
		example: {
			says: 'eight around a flange: the third of them',
			gives: () => first(orderFromMiddle(flange), 2),
			wanted: 3,
			within: 0.01
		}
	},
	{
		id: 'fasteners/sound-next-loose',
		works: soundNextLoose,
		formula: 'flange: as for tightening; else largest distance from the middle',
		source: 'reverse of the centre-outward rule, common practice, no source',
		example: {
			says: 'four in a row, named left to right: an end comes first',
			gives: () => first(soundNextLoose(row, []), 0),
			wanted: 1,
			within: 0.01
		}
	},
	{
		id: 'fasteners/order-from-outside',
		works: orderFromOutside,
		formula: 'the reverse of the tightening order where that is sound, else crosswise',
		source: 'reverse of the centre-outward rule, common practice, no source',
		example: {
			says: 'four in a row, named left to right: the last to be loosened',
			gives: () => first(orderFromOutside(row), 3),
			wanted: 2,
			within: 0.01
		}
	},
	{
		id: 'fasteners/ring-pattern',
		works: ringPattern,
		formula: 'x = D/2 · sin(360° · i / n), y = D/2 · cos(360° · i / n)',
		source: 'even division of a circle, by definition',
		example: {
			says: 'six on a circle of 100 mm: the second lies 50 · sin 60° to the right',
			gives: () => {
				const found = ringPattern(6, 100);
				return found.ok ? computed(found.value[1]?.xMm ?? 0) : found;
			},
			wanted: 43.3013,
			within: 1e-4
		}
	},
	{
		id: 'fasteners/thirds',
		works: thirdsNm,
		formula: 'T/3, 2T/3, T',
		source: 'common practice, no source; what the maker prints wins',
		example: {
			says: '75 N·m, the first stage',
			gives: () => {
				const found = thirdsNm(75);
				return found.ok ? computed(found.value[0] ?? 0) : found;
			},
			wanted: 25,
			within: 0.1
		}
	}
];
