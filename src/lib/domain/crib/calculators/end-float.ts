import { endFloatMm } from '$lib/kernel/geometry/end-play';
import { ofWeightedReadingsMm } from '$lib/kernel/geometry/weighted-readings';
import { computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { quantity } from '../field';
import { clearancePresets } from './bores/clearance-presets';
import { length, mm, uncertaintyOf } from './bores/faces';
import { limitFields } from './bores/limit-fields';
import { ruledBothEnds } from './bores/two-sided';
import { bracketed, figure } from './formula-figures';

const dial = { ...length, decimals: 3, least: -50, most: 50 } as const;

/** How far a shaft moves along, or a rod on its pin. */
export const endFloat = calculator({
	key: 'end-float',
	title: 'End float and side clearance',
	says: 'How far a crankshaft moves along its bearings, or a rod along its pin, from a dial pushed one way and the other.',
	drawer: 'bores',
	caution:
		'Pry only where the maker allows it, and never against a shell or a sensor ring. A shaft with too much float rubs through its thrust washers and then the block.',
	formulas: ['geometry/end-float', 'geometry/of-weighted-readings', 'measurement/ruling'],
	sources: ['With a feeler: type 0 and the thickest blade that enters.'],
	fields: {
		towards: quantity({
			...dial,
			words: 'Dial, pushed one way',
			hint: 'Until it stops, without force.',
			example: '0.02'
		}),
		away: quantity({ ...dial, words: 'Dial, pushed the other way', example: '0.17' }),
		...limitFields('float', { buildLeast: '0.08', buildMost: '0.24', runMost: '0.3' }),
		uncertainty: uncertaintyOf('Uncertainty of one dial reading', '0.008')
	},
	work({ towards, away, uncertainty, ...limits }) {
		const found = endFloatMm(towards, away);
		if (!found.ok) return found;
		const float = found.value;
		const expanded =
			uncertainty === undefined ? undefined : ofWeightedReadingsMm([1, -1], uncertainty);
		if (expanded && !expanded.ok) return expanded;
		const both = { leastMm: float, mostMm: float };
		const rulings = ruledBothEnds('End float', both, expanded?.value, limits);
		if (!rulings.ok) return rulings;
		return computed({
			lines: [{ key: 'float', words: 'End float', value: float, ...mm, main: true }],
			working: [
				{
					words: 'One reading less the other, without its sign',
					rule: 'float = |away − to|',
					formula: `|${figure(away)} − ${bracketed(towards)}|`,
					value: float,
					...mm
				},
				...(expanded && uncertainty !== undefined
					? [
							{
								words: 'Its uncertainty: both readings count',
								rule: 'U = U1 · √(1² + 1²)',
								formula: `${figure(uncertainty, 4)} · √(1² + 1²)`,
								value: expanded.value,
								unit: 'mm',
								decimals: 4
							}
						]
					: [])
			],
			rulings: rulings.value,
			notes:
				float === 0
					? ['A shaft that does not move at all is stuck, or the dial does not touch it.']
					: [],
			drawing: { kind: 'end-float', towardsMm: towards, awayMm: away, floatMm: float }
		});
	},
	presets: (sheet) => clearancePresets(sheet, /(endFloat|(pin|rod)\w*\.sideClearance)$/i)
});
