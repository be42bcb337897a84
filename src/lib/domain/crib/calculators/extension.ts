import { forgottenExtension } from '$lib/kernel/fasteners/drag';
import { effectiveLever, torqueAtFastener, wrenchSetting } from '$lib/kernel/fasteners/extension';
import { computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { quantity } from '../field';
import { figure } from './formula-figures';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' }, decimals: 0 } as const;

/** What to set on a wrench that drives through an extension or crowfoot. */
export const extension = calculator({
	key: 'extension',
	title: 'Wrench with an extension',
	says: 'What to set on a torque wrench that drives through a crowfoot or an extension at any angle, and what arrives if that is forgotten.',
	drawer: 'fasteners',
	caution:
		'The rule holds for a hand in the middle of the grip. An extension in line with the socket, straight down, changes nothing; one that flexes is not set by this rule.',
	formulas: [
		'fasteners/effective-lever',
		'fasteners/wrench-setting',
		'fasteners/torque-at-fastener',
		'fasteners/forgotten-extension'
	],
	fields: {
		torque: quantity({
			dimension: 'torque',
			unit: { metric: 'N·m', inch: 'lbf·ft' },
			words: 'Torque wanted at the fastener',
			decimals: 1,
			least: 0,
			most: 20_000,
			example: '80'
		}),
		lever: quantity({
			...length,
			words: 'L, middle of the grip to the square',
			least: 20,
			most: 5000,
			example: '400'
		}),
		reach: quantity({
			...length,
			words: 'E, square to the fastener',
			least: 0,
			most: 3000,
			example: '100'
		}),
		angle: quantity({
			dimension: 'angle',
			unit: { metric: '°', inch: '°' },
			words: 'Angle of the extension to the wrench',
			hint: '0° straight on, 90° across, 180° back along the handle.',
			decimals: 0,
			least: 0,
			most: 360,
			example: '60'
		})
	},
	work({ torque, lever: lengthL, reach: extensionE, angle: angleDeg }) {
		const lever = { lengthL, extensionE, angleDeg };
		const [effective, setting, arrives, error] = [
			effectiveLever(lever),
			wrenchSetting({ torque, ...lever }),
			torqueAtFastener({ torque, ...lever }),
			forgottenExtension(lengthL, extensionE, angleDeg)
		];
		if (!effective.ok) return effective;
		if (!setting.ok) return setting;
		if (!arrives.ok) return arrives;
		if (!error.ok) return error;
		const nm = { unit: 'N·m', decimals: 1 };
		return computed({
			lines: [
				{ key: 'setting', words: 'Set the wrench to', value: setting.value, ...nm, main: true },
				{
					key: 'arrives',
					words: 'Set to the printed torque, the fastener would get',
					value: arrives.value,
					...nm
				},
				{
					key: 'error',
					words: 'which is wrong by',
					value: error.value * 100,
					unit: '%',
					decimals: 1
				},
				{
					key: 'effective',
					words: 'Lever that the hand works with',
					value: effective.value,
					unit: 'mm',
					decimals: 1
				}
			],
			working: [
				{
					words: 'Lever from the grip to the fastener, along the wrench',
					rule: 'Leff = L + E · cos φ',
					formula: `${figure(lengthL, 1)} + ${figure(extensionE, 1)} · cos ${figure(angleDeg, 0)}°`,
					value: effective.value,
					unit: 'mm',
					decimals: 1
				},
				{
					words: 'Setting',
					rule: 'Tw = Ta · L / Leff',
					formula: `${figure(torque, 1)} · ${figure(lengthL, 1)} / ${figure(effective.value, 1)}`,
					value: setting.value,
					...nm
				}
			],
			drawing: {
				kind: 'wrench',
				lengthMm: lengthL,
				extensionMm: extensionE,
				angleDeg,
				effectiveMm: effective.value
			}
		});
	},
	presets: (sheet) =>
		sheet.fasteners.flatMap(({ key, words, stages }) => {
			const last = stages.flatMap((one) => ('torqueNm' in one ? [one.torqueNm] : [])).at(-1);
			return last === undefined ? [] : [{ key, words, values: { torque: String(last) } }];
		})
});
