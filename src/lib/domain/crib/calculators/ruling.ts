import { ruledWithProbability } from '$lib/kernel/measurement/conformance';
import { guardBandRules } from '$lib/kernel/measurement/guard-band';
import type { Limits, RulingName } from '$lib/kernel/measurement/ruling';
import { coverageFactor } from '$lib/kernel/measurement/uncertainty';
import { computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { conformanceDrawing } from '../drawings/conformance';
import { choice, quantity } from '../field';
import { limitPresets } from './measuring/limit-presets';
import { placesFor } from './measuring/printed';
import { rulingSteps } from './measuring/ruling-steps';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' }, decimals: 4 } as const;
const names: Record<RulingName, string> = {
	within: 'Within',
	out: 'Out',
	'too-close': 'Too close to call'
};

/** A reading held against its limits, with how sure the ruling is. */
export const ruling = calculator({
	key: 'ruling',
	title: 'A reading against its limits',
	says: 'Within, out, or too close to call, by a guard band of the reading’s uncertainty, and how probable it is that the part lies within.',
	drawer: 'measuring',
	caution:
		'A ruling answers one question about one size. A part that is within by its diameter can still be cracked, blued or out of round: look at it, and rule each size that has limits.',
	formulas: ['measurement/ruling', 'measurement/guard-band', 'measurement/conformance'],
	fields: {
		question: choice({
			words: 'The question',
			options: [
				{ value: 'build', words: 'May it go into a fresh build' },
				{ value: 'run-again', words: 'May it run again as it is' }
			],
			initial: 'run-again',
			example: 'run-again'
		}),
		value: quantity({ ...length, words: 'Reading', example: '0.068' }),
		expanded: quantity({
			...length,
			words: 'Its uncertainty, plus or minus',
			hint: 'Expanded uncertainty U with k = 2. A clearance carries that of both readings.',
			least: 0,
			example: '0.004'
		}),
		least: quantity({ ...length, words: 'At least', optional: true, example: '0.020' }),
		most: quantity({ ...length, words: 'At most', optional: true, example: '0.070' }),
		rule: choice({
			words: 'Guard band',
			options: [
				{ value: 'full-U', words: 'g = U, the house’s rule' },
				{ value: 'one-sided-95', words: 'g = 1.645 u, 95 % on one side' }
			],
			initial: 'full-U',
			example: 'full-U'
		})
	},
	work({ question, value, expanded, least, most, rule }) {
		const limits: Limits = {
			...(least === undefined ? {} : { least }),
			...(most === undefined ? {} : { most })
		};
		const asked = { question, value, expandedUncertainty: expanded, rule, ...limits };
		const found = ruledWithProbability(asked);
		if (!found.ok) return found;
		const { conformance, guardBand } = found.value;
		const decimals = Math.max(3, placesFor(expanded));
		const unit = 'mm';
		return computed({
			lines: [
				{
					key: 'ruling',
					words: 'Ruling',
					text: names[found.value.ruling],
					main: true
				},
				{
					key: 'conformance',
					words: 'Probability that it lies within',
					value: 100 * conformance,
					unit: '%',
					decimals: 2,
					main: true
				},
				{
					key: 'guard-band',
					words: `Guard band, ${guardBandRules[rule].says}`,
					value: guardBand,
					unit,
					decimals
				},
				...(least === undefined
					? []
					: [
							{ key: 'from', words: 'Called within from', value: least + guardBand, unit, decimals }
						]),
				...(most === undefined
					? []
					: [
							{
								key: 'up-to',
								words: 'Called within up to',
								value: most - guardBand,
								unit,
								decimals
							}
						])
			],
			working: rulingSteps(asked, found.value, decimals),
			rulings: [
				{
					of: 'Reading',
					question,
					value,
					expandedUncertainty: expanded,
					unit,
					decimals,
					...limits,
					ruling: found.value
				}
			],
			notes:
				least !== undefined && most !== undefined && most - least < 2 * guardBand
					? [
							'These limits lie closer together than twice the guard band: no reading with this uncertainty can be called within.'
						]
					: [],
			drawing: conformanceDrawing({
				value,
				standard: expanded / coverageFactor,
				guardBand,
				conformance,
				unit,
				decimals,
				limits: [
					...(least === undefined ? [] : [{ at: least, side: 'least' as const }]),
					...(most === undefined ? [] : [{ at: most, side: 'most' as const }])
				]
			})
		});
	},
	presets: (sheet) =>
		limitPresets(sheet).map(({ key, words, question, limits }) => ({
			key,
			words,
			values: { question, ...limits }
		}))
});
