import { crushFromGap, crushOf, freeSpreadMm } from '$lib/kernel/geometry/bearing-shell';
import { ofWeightedReadingsMm } from '$lib/kernel/geometry/weighted-readings';
import { cannot, computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { choice, quantity } from '../field';
import { length, limit, mm, size, uncertaintyOf } from './bores/faces';
import { limitsOf, ruledBetween } from './bores/ruled-between';
import { figure } from './formula-figures';

/** Whether half shells sit: their crush at the split and their free spread. */
export const shellCrush = calculator({
	key: 'shell-crush',
	title: 'Crush and spread of shells',
	says: 'How far half shells stand proud at the split, how hard they press into their housing, and whether they hold themselves in place.',
	drawer: 'bores',
	caution:
		'Never file a cap, a rod or a shell to change the crush: a shell with too little turns in its housing and ends the engine. Dirt behind a shell reads as crush, so wipe both first.',
	formulas: [
		'geometry/crush-from-gap',
		'geometry/crush',
		'geometry/free-spread',
		'geometry/of-weighted-readings',
		'measurement/ruling'
	],
	fields: {
		how: choice({
			words: 'How it was measured',
			options: [
				{ value: 'gap', words: 'Feeler at the split, one bolt loosened' },
				{ value: 'length', words: 'Length around the back of one half' }
			],
			initial: 'gap',
			example: 'gap'
		}),
		housing: quantity({
			...size,
			words: 'Housing bore',
			hint: 'Cap tightened, without shells.',
			example: '43.004'
		}),
		gap: quantity({
			...length,
			words: 'Gap at the split',
			hint: 'Both bolts tightened through every stage, then one loosened.',
			decimals: 2,
			least: 0,
			most: 2,
			optional: true,
			example: '0.06'
		}),
		around: quantity({
			...size,
			words: 'Length around the back',
			hint: 'Of one half shell, as a fixture gives it.',
			optional: true,
			example: ''
		}),
		freeWidth: quantity({
			...size,
			words: 'Free width across the joint faces',
			hint: 'The shell lying loose on the bench.',
			optional: true,
			example: '43.6'
		}),
		least: limit('Least crush of one half', '0.02'),
		most: limit('Most crush of one half', '0.05'),
		uncertainty: uncertaintyOf('Uncertainty of one reading', '0.01')
	},
	work({ how, housing, gap, around, freeWidth, least, most, uncertainty }) {
		const read = how === 'gap' ? gap : around;
		if (read === undefined)
			return cannot(
				how === 'gap' ? 'type the gap at the split' : 'type the length around the back of one half'
			);
		const found = how === 'gap' ? crushFromGap(read) : crushOf(read, housing);
		if (!found.ok) return found;
		const { crushMm: crush, interferenceMm: press } = found.value;
		const spread = freeWidth === undefined ? undefined : freeSpreadMm(freeWidth, housing);
		if (spread && !spread.ok) return spread;
		const weights = how === 'gap' ? [0.5] : [1, -Math.PI / 2];
		const expanded =
			uncertainty === undefined ? undefined : ofWeightedReadingsMm(weights, uncertainty);
		if (expanded && !expanded.ok) return expanded;
		const rulings = ruledBetween([
			{
				of: 'Crush of one half',
				valueMm: crush,
				expandedMm: expanded?.value,
				build: limitsOf(least, most)
			}
		]);
		if (!rulings.ok) return rulings;
		return computed({
			lines: [
				{ key: 'crush', words: 'Crush of one half', value: crush, ...mm, main: true },
				{ key: 'press', words: 'Press of both, in diameter', value: press, ...mm },
				...(spread
					? [{ key: 'spread', words: 'Free spread', value: spread.value, ...mm, main: true }]
					: [])
			],
			working: [
				how === 'gap'
					? {
							words: 'Crush of one half: the gap is that of both',
							rule: 'crush = g / 2',
							formula: `${figure(read)} / 2`,
							value: crush,
							...mm
						}
					: {
							words: 'Crush: length around the back less half the housing’s circumference',
							rule: 'crush = s − π · H / 2',
							formula: `${figure(read)} − π · ${figure(housing)} / 2`,
							value: crush,
							...mm
						},
				{
					words: 'What both press together in diameter',
					rule: 'interference = 2 · crush / π',
					formula: `2 · ${figure(crush)} / π`,
					value: press,
					...mm
				},
				...(spread && freeWidth !== undefined
					? [
							{
								words: 'Free spread: width across the faces less housing',
								rule: 'spread = w − H',
								formula: `${figure(freeWidth)} − ${figure(housing)}`,
								value: spread.value,
								...mm
							}
						]
					: [])
			],
			rulings: rulings.value,
			notes: [
				...(crush <= 0
					? [
							'These shells are loose in their housing: they turn. Look for a wrong part, a stretched housing or a filed cap.'
						]
					: []),
				...(spread && spread.value <= 0
					? ['A shell no wider than its housing falls out when the cap is off, and is not fitted.']
					: [])
			],
			drawing: {
				kind: 'shell-crush',
				housingMm: housing,
				crushMm: crush,
				...(how === 'gap' ? { gapMm: read } : {}),
				...(freeWidth === undefined ? {} : { freeWidthMm: freeWidth })
			}
		});
	}
});
