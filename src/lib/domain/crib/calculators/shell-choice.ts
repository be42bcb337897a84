import { chooseShells } from '$lib/kernel/geometry/shell-choice';
import { ofWeightedReadingsMm } from '$lib/kernel/geometry/weighted-readings';
import { computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { quantity, table } from '../field';
import { clearancePresets } from './bores/clearance-presets';
import { length, mm, size, uncertaintyOf } from './bores/faces';
import { limitsOf, ruledBetween } from './bores/ruled-between';
import { figure } from './formula-figures';

const limit = { ...length, decimals: 3, least: 0, most: 5 } as const;

/** Clearance from housing, shell wall and pin, for each shell that can be had. */
export const shellChoice = calculator({
	key: 'shell-choice',
	title: 'Choosing shells',
	says: 'The oil clearance that each listed shell would give in a measured housing on a measured pin, and which of them to fit.',
	drawer: 'bores',
	caution:
		'Measure the housing with its cap tightened and no shells in. The choice is a plan: press of the shells and scatter of their walls change it, so measure the bearing bore with the chosen shells in before you build.',
	formulas: [
		'geometry/clearance-from-shells',
		'geometry/shell-choice',
		'geometry/of-weighted-readings',
		'measurement/ruling'
	],
	fields: {
		housing: quantity({
			...size,
			words: 'Housing bore',
			hint: 'Cap tightened, without shells, square to the split.',
			example: '43.004'
		}),
		pin: quantity({ ...size, words: 'Pin', hint: 'Its largest reading.', example: '39.988' }),
		shells: table({
			...length,
			words: 'Shells that can be had',
			hint: 'Wall thickness at the crown, by a ball-ended micrometer or as printed.',
			row: 'Shell',
			columns: [
				{ key: 'name', words: 'Mark', of: 'text' },
				{ key: 'wall', words: 'Wall', of: 'quantity' }
			],
			rows: { from: 3, least: 1, most: 10 },
			example: 'red_1.486*blue_1.489*green_1.492'
		}),
		least: quantity({ ...limit, words: 'Least clearance, to build', example: '0.02' }),
		most: quantity({ ...limit, words: 'Most clearance, to build', example: '0.048' }),
		uncertainty: uncertaintyOf('Uncertainty of each reading', '0.002')
	},
	work({ housing, pin, shells, least, most, uncertainty }) {
		const named = shells.map(({ name, wall }) => ({
			name: String(name),
			wallMm: typeof wall === 'number' ? wall : 0
		}));
		const walls = named.map((one) => one.wallMm);
		const found = chooseShells(housing, pin, walls, { leastMm: least, mostMm: most });
		if (!found.ok) return found;
		const { clearancesMm, chosen } = found.value;
		const shown = named.map((one, at) => ({ ...one, clearanceMm: clearancesMm[at] ?? 0 }));
		const taken = chosen === undefined ? undefined : shown[chosen];
		const expanded =
			uncertainty === undefined ? undefined : ofWeightedReadingsMm([1, -2, -1], uncertainty);
		if (expanded && !expanded.ok) return expanded;
		const rulings = ruledBetween(
			taken
				? [
						{
							of: `Clearance with ${taken.name}`,
							valueMm: taken.clearanceMm,
							expandedMm: expanded?.value,
							build: limitsOf(least, most)
						}
					]
				: []
		);
		if (!rulings.ok) return rulings;
		return computed({
			lines: [
				{
					key: 'shell',
					words: 'Shell to fit',
					text: taken ? taken.name : 'none of these gives a clearance inside the limits',
					main: true
				},
				...(taken
					? [
							{
								key: 'clearance',
								words: 'Clearance with it',
								value: taken.clearanceMm,
								...mm,
								main: true
							}
						]
					: []),
				...shown.flatMap(({ name, clearanceMm }, at) =>
					at === chosen
						? []
						: [{ key: `shell-${at + 1}`, words: `With ${name}`, value: clearanceMm, ...mm }]
				)
			],
			working: [
				...shown.map(({ name, wallMm, clearanceMm }) => ({
					words: `Clearance with ${name}: housing less two walls less pin`,
					rule: 'C = H − 2 · w − D',
					formula: `${figure(housing)} − 2 · ${figure(wallMm)} − ${figure(pin)}`,
					value: clearanceMm,
					...mm
				})),
				...(expanded && uncertainty !== undefined
					? [
							{
								words: 'Its uncertainty: the wall counts twice',
								rule: 'U = U1 · √(1² + 2² + 1²)',
								formula: `${figure(uncertainty, 4)} · √(1² + 2² + 1²)`,
								value: expanded.value,
								unit: 'mm',
								decimals: 4
							}
						]
					: [])
			],
			rulings: rulings.value,
			notes: taken
				? [
						`Of those inside the limits ${taken.name} lies nearest their middle. Where the maker prints which mark belongs to which size, that wins.`
					]
				: [],
			drawing: {
				kind: 'shell-choice',
				housingMm: housing,
				pinMm: pin,
				shells: shown,
				...(chosen === undefined ? {} : { chosen }),
				leastMm: least,
				mostMm: most
			}
		});
	},
	presets: (sheet) =>
		clearancePresets(sheet, /oilClearance$/i).map(({ key, words, values }) => ({
			key,
			words,
			values: { least: values.buildLeast ?? '', most: values.buildMost ?? '' }
		}))
});
