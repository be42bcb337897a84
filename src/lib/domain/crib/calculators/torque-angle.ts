import { preloadN } from '$lib/kernel/fasteners/preload';
import { boltLoads } from '$lib/kernel/fasteners/proof-load';
import { boltStiffnessNPerMm, inSeriesNPerMm } from '$lib/kernel/fasteners/stiffness';
import { tightenByAngle } from '$lib/kernel/fasteners/torque-angle';
import { travelMm } from '$lib/kernel/fasteners/turn';
import { computed } from '$lib/kernel/outcome';
import { nutFactorOf } from '../../data-sheets/nut-factors';
import { calculator } from '../calculator';
import { number, quantity } from '../field';
import {
	boltPresets,
	diameter,
	lastTorqueNm,
	length,
	pitch,
	propertyClass,
	torque
} from './fasteners/bolt-fields';

/** Load of a bolt by a snug torque and an angle, to yield and past it. */
export const torqueAngle = calculator({
	key: 'torque-angle',
	title: 'Torque plus angle',
	says: 'How hard a bolt pulls after a snug torque and an angle, where it begins to yield, and how far it is drawn beyond.',
	drawer: 'fasteners',
	caution:
		'A bolt that has been turned past yield is fitted once: it is thrown away, however good it looks. Mark head and part before you turn, and count the angle once only.',
	formulas: [
		'fasteners/preload',
		'fasteners/bolt-loads',
		'fasteners/bolt-stiffness',
		'fasteners/in-series',
		'fasteners/travel',
		'fasteners/torque-angle'
	],
	sources: [
		'How much stiffer the clamped parts are than the bolt: two to five times is met in heads and caps; common practice, no source.'
	],
	fields: {
		diameter,
		pitch,
		propertyClass,
		grip: quantity({
			...length,
			words: 'Stretched length',
			hint: 'From under the head to the first thread that carries.',
			decimals: 1,
			least: 3,
			most: 2000,
			example: '95'
		}),
		snug: quantity({ ...torque, words: 'Snug torque', least: 0.1, most: 5000, example: '30' }),
		angle: quantity({
			dimension: 'angle',
			unit: { metric: '°', inch: '°' },
			words: 'Angle after it, all stages together',
			decimals: 0,
			least: 0,
			most: 720,
			example: '180'
		}),
		factor: number({
			words: 'Nut factor K of the snug torque',
			hint: 'Engine oil 0.15 to 0.20.',
			least: 0.03,
			most: 0.6,
			example: '0.17'
		}),
		joint: number({
			words: 'Clamped parts, times as stiff as the bolt',
			least: 0.2,
			most: 100,
			example: '3',
			initial: '3'
		})
	},
	work({ diameter: d, pitch: p, propertyClass: named, grip, snug, angle, factor, joint }) {
		const loads = boltLoads(d, p, named);
		if (!loads.ok) return loads;
		const first = preloadN(snug, factor, d);
		if (!first.ok) return first;
		const bolt = boltStiffnessNPerMm([{ lengthMm: grip, areaMm2: loads.value.areaMm2 }]);
		if (!bolt.ok) return bolt;
		const both = inSeriesNPerMm(bolt.value, bolt.value * joint);
		if (!both.ok) return both;
		const turned = tightenByAngle({
			snugN: first.value,
			angleDeg: angle,
			pitchMm: p,
			boltNPerMm: bolt.value,
			jointNPerMm: bolt.value * joint,
			yieldN: loads.value.yieldN
		});
		if (!turned.ok) return turned;
		const { preloadN: load, angleAtYieldDeg, beyondYield, lastingMm, points } = turned.value;
		const kn = { unit: 'kN', decimals: 1 };
		const knPerMm = { unit: 'kN/mm', decimals: 1 };
		const travel = travelMm(angle, p);
		const lastingShare = (100 * lastingMm) / grip;
		return computed({
			lines: [
				{ key: 'preload', words: 'Preload', value: load / 1000, ...kn, main: true },
				{
					key: 'yield-angle',
					words: 'Begins to yield after',
					value: angleAtYieldDeg,
					unit: '°',
					decimals: 0,
					main: true
				},
				{ key: 'lasting', words: 'Drawn for good', value: lastingMm, unit: 'mm', decimals: 3 },
				{
					key: 'lasting-share',
					words: 'of its stretched length',
					value: lastingShare,
					unit: '%',
					decimals: 2
				},
				{ key: 'yield', words: 'Load at yield', value: loads.value.yieldN / 1000, ...kn }
			],
			working: [
				{
					words: 'Load by the snug torque',
					rule: 'Fs = T / (K · d)',
					formula: `${snug} / (${factor} · ${d / 1000}) / 1000`,
					value: first.value / 1000,
					...kn
				},
				{
					words: 'Stiffness of the bolt',
					rule: 'kb = E · As / L',
					formula: `205 · ${loads.value.areaMm2} / ${grip}`,
					value: bolt.value / 1000,
					...knPerMm
				},
				{
					words: 'Bolt and parts together',
					rule: 'k = kb · kj / (kb + kj)',
					formula: `${(bolt.value / 1000).toFixed(1)} · ${joint} / (1 + ${joint})`,
					value: both.value / 1000,
					...knPerMm
				},
				{
					words: 'Way along the thread',
					rule: 's = P · α / 360°',
					formula: `${p} · ${angle} / 360`,
					value: travel,
					unit: 'mm',
					decimals: 3
				},
				{
					words: 'Load at yield',
					rule: 'Fy = As · Re',
					value: loads.value.yieldN / 1000,
					...kn
				},
				{
					words: 'Angle at which it begins to yield',
					rule: 'αy = 360° · (Fy − Fs) / (k · P)',
					formula: `360 · (${(loads.value.yieldN / 1000).toFixed(1)} − ${(first.value / 1000).toFixed(1)}) / (${(both.value / 1000).toFixed(1)} · ${p})`,
					value: angleAtYieldDeg,
					unit: '°',
					decimals: 0
				},
				beyondYield
					? {
							words: 'The angle goes past yield: the load stays there',
							rule: 'F = Fy',
							value: load / 1000,
							...kn
						}
					: {
							words: 'Load after the angle',
							rule: 'F = Fs + k · s',
							formula: `${(first.value / 1000).toFixed(1)} + ${(both.value / 1000).toFixed(1)} · ${travel.toFixed(3)}`,
							value: load / 1000,
							...kn
						}
			],
			notes: beyondYield
				? [
						`Turned past yield, by ${(angle - angleAtYieldDeg).toFixed(0)}°: single use. Makers do this on purpose, since the load then hardly depends on friction.`,
						...(lastingShare > 1
							? [
									'Drawn by more than one per cent of its length: look at the angle and the stretched length again.'
								]
							: [])
					]
				: [],
			drawing: {
				kind: 'torque-angle',
				lines: [points],
				stagesDeg: [angle],
				yieldN: loads.value.yieldN,
				proofN: loads.value.proofN,
				angleAtYieldDeg
			}
		});
	},
	presets: (sheet) =>
		boltPresets(sheet, (bolt) => {
			const last = lastTorqueNm(bolt);
			const angle = bolt.stages.reduce(
				(sum, one) => sum + ('angleDeg' in one ? one.angleDeg : 0),
				0
			);
			if (last === undefined || angle === 0) return undefined;
			const factor = nutFactorOf(bolt);
			return {
				diameter: String(bolt.thread.diameterMm),
				pitch: String(bolt.thread.pitchMm),
				propertyClass: bolt.propertyClass,
				...(bolt.gripMm ? { grip: String(bolt.gripMm) } : {}),
				snug: String(last),
				angle: String(angle),
				factor: ((factor.least + factor.most) / 2).toFixed(3)
			};
		})
});
