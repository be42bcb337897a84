import { forgottenExtension, withDrag } from '$lib/kernel/fasteners/drag';
import { effectiveLever, torqueAtFastener, wrenchSetting } from '$lib/kernel/fasteners/extension';
import { lastTorqueNm } from '$lib/kernel/fasteners/stage-sequence';
import { accuracyFrom, bestRange, shareOfScale } from '$lib/kernel/fasteners/wrench-range';
import { cannot, computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { quantity } from '../field';
import { figure, plain } from './formula-figures';
import { allOf } from './temperature/all-of';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' }, decimals: 0 } as const;
const torqueField = {
	dimension: 'torque',
	unit: { metric: 'N·m', inch: 'lbf·ft' },
	decimals: 1,
	most: 20_000
} as const;
const nm = { unit: 'N·m', decimals: 1 } as const;

/** What to set on a wrench that drives through an extension or crowfoot. */
export const extension = calculator({
	key: 'extension',
	title: 'Wrench with an extension',
	says: 'What to set on a torque wrench that drives through a crowfoot or an extension at any angle, and what arrives if that is forgotten.',
	drawer: 'fasteners',
	caution:
		'The rule holds for a hand in the middle of the grip: another place on the handle gives another torque. An extension in line with the socket, straight down, changes nothing; one that flexes is not set by this rule.',
	formulas: [
		'fasteners/effective-lever',
		'fasteners/wrench-setting',
		'fasteners/torque-at-fastener',
		'fasteners/forgotten-extension',
		'fasteners/with-drag',
		'fasteners/share-of-scale'
	],
	fields: {
		torque: quantity({
			...torqueField,
			words: 'Torque wanted at the fastener',
			least: 0.1,
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
		}),
		drag: quantity({
			...torqueField,
			words: 'Torque that a self-locking nut drags',
			hint: 'Measured while it runs on free, and added to what the joint wants.',
			least: 0,
			optional: true,
			example: ''
		}),
		fullScale: quantity({
			...torqueField,
			words: 'Full scale of the wrench',
			least: 0.1,
			optional: true,
			example: '200'
		})
	},
	work({ torque: joint, lever: lengthL, reach: extensionE, angle: angleDeg, drag, fullScale }) {
		const lever = { lengthL, extensionE, angleDeg };
		const wanted = withDrag(joint, drag ?? 0);
		if (!wanted.ok) return wanted;
		const torque = wanted.value;
		const found = allOf({
			effective: effectiveLever(lever),
			setting: wrenchSetting({ torque, ...lever }),
			arrives: torqueAtFastener({ torque, ...lever }),
			error: forgottenExtension(lengthL, extensionE, angleDeg)
		});
		if (!found.ok) return found;
		const { effective, setting, arrives, error } = found.value;
		const share = fullScale === undefined ? undefined : shareOfScale(setting, fullScale);
		if (share && !share.ok) return cannot(`set to ${figure(setting, 1)} N·m: ${share.because}`);
		return computed({
			lines: [
				{ key: 'setting', words: 'Set the wrench to', value: setting, ...nm, main: true },
				{
					key: 'arrives',
					words: 'Set to the wanted torque, the fastener would get',
					value: arrives,
					...nm
				},
				{ key: 'error', words: 'which is wrong by', value: error * 100, unit: '%', decimals: 1 },
				{
					key: 'effective',
					words: 'Lever that the hand works with',
					value: effective,
					unit: 'mm',
					decimals: 1
				},
				...(share
					? [
							{
								key: 'share',
								words: 'Setting, of the full scale of the wrench',
								value: share.value * 100,
								unit: '%',
								decimals: 0
							}
						]
					: [])
			],
			working: [
				...(drag
					? [
							{
								words: 'Torque at the fastener, with what the nut drags',
								rule: 'Ta = wanted + drag',
								formula: `${plain(joint)} + ${plain(drag)}`,
								value: torque,
								...nm
							}
						]
					: []),
				{
					words: 'Lever from the grip to the fastener, along the wrench',
					rule: 'Leff = L + E · cos φ',
					formula: `${plain(lengthL)} + ${plain(extensionE)} · cos ${plain(angleDeg)}°`,
					value: effective,
					unit: 'mm',
					decimals: 1
				},
				{
					words: 'Setting',
					rule: 'Tw = Ta · L / Leff',
					formula: `${plain(torque)} · ${plain(lengthL)} / ${figure(effective, 1)}`,
					value: setting,
					...nm
				},
				{
					words: 'Set to the wanted torque, the fastener would get',
					rule: 'T = Ta · Leff / L',
					formula: `${plain(torque)} · ${figure(effective, 1)} / ${plain(lengthL)}`,
					value: arrives,
					...nm
				},
				{
					words: 'Error, if the extension is forgotten',
					rule: 'error = E · cos φ / L',
					formula: `${plain(extensionE)} · cos ${plain(angleDeg)}° / ${plain(lengthL)}`,
					value: error * 100,
					unit: '%',
					decimals: 1
				},
				...(share
					? [
							{
								words: 'Share of the scale',
								rule: 'share = Tw / full scale',
								formula: `${figure(setting, 1)} / ${plain(fullScale ?? 0)}`,
								value: share.value * 100,
								unit: '%',
								decimals: 0
							}
						]
					: [])
			],
			notes: [...(share ? scaleNotes(share.value) : []), ...angleNotes(error, extensionE)],
			drawing: {
				kind: 'wrench',
				lengthMm: lengthL,
				extensionMm: extensionE,
				angleDeg,
				effectiveMm: effective,
				settingNm: setting,
				torqueNm: torque
			}
		});
	},
	presets: (sheet) =>
		sheet.fasteners.flatMap((bolt) => {
			const torque = lastTorqueNm(bolt.stages);
			return torque === undefined
				? []
				: [{ key: bolt.key, words: bolt.words, values: { torque: String(torque) } }];
		})
});

function scaleNotes(share: number): string[] {
	if (share < accuracyFrom)
		return [
			`Below ${100 * accuracyFrom} % of its full scale no accuracy is stated for a torque wrench: take a smaller one.`
		];
	return share < bestRange.least || share > bestRange.most
		? [
				`A torque wrench is at its best between ${100 * bestRange.least} and ${100 * bestRange.most} % of its full scale.`
			]
		: [];
}

function angleNotes(error: number, extensionE: number): string[] {
	return extensionE > 0 && Math.abs(error) < 0.005
		? ['Square across, the extension changes the setting by less than half a per cent.']
		: [];
}
