import { assemblyPreloadN } from '$lib/kernel/fasteners/assembly-preload';
import {
	bearingMeanMm,
	preloadByFrictionN,
	torqueByFriction
} from '$lib/kernel/fasteners/friction';
import { classStrength } from '$lib/kernel/fasteners/strength';
import { threadOf } from '$lib/kernel/fasteners/thread';
import { cannot, computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { number, quantity } from '../field';
import {
	boltPresets,
	diameter,
	force,
	lastTorqueNm,
	length,
	pitch,
	propertyClass,
	torque
} from './fasteners/bolt-fields';

const coefficient = { least: 0, most: 1 };

/** Torque and preload by the friction of thread and head, and where the torque goes. */
export const friction = calculator({
	key: 'friction',
	title: 'Where a torque goes',
	says: 'Torque and preload by the friction of thread and head: how much of the torque stretches the bolt, and how much the two frictions eat.',
	drawer: 'fasteners',
	caution:
		'Oil on a thread that is printed dry, or a new washer under a used bolt, changes the pull by a third at the same torque. Tighten as the maker says it was measured.',
	formulas: [
		'fasteners/torque-by-friction',
		'fasteners/preload-by-friction',
		'fasteners/bearing-mean',
		'fasteners/thread',
		'fasteners/assembly-preload'
	],
	fields: {
		diameter,
		pitch,
		propertyClass,
		outer: quantity({
			...length,
			words: 'Bearing face under the head, outer diameter',
			hint: 'The ring that turns on the part or washer.',
			decimals: 1,
			least: 1,
			most: 400,
			example: '14.6'
		}),
		hole: quantity({ ...length, words: 'Hole', decimals: 1, least: 1, most: 300, example: '11' }),
		threadFriction: number({
			...coefficient,
			words: 'Friction in the thread',
			hint: 'Oiled steel about 0.12; dry 0.15 to 0.20.',
			example: '0.12'
		}),
		headFriction: number({ ...coefficient, words: 'Friction under the head', example: '0.12' }),
		torque: quantity({
			...torque,
			words: 'Torque',
			hint: 'Fill in this, or the wanted preload.',
			least: 0.01,
			most: 20_000,
			optional: true,
			example: '75'
		}),
		wanted: quantity({
			...force,
			words: 'Wanted preload',
			decimals: 1,
			least: 0.01,
			most: 5000,
			optional: true,
			example: ''
		})
	},
	work({
		diameter: d,
		pitch: p,
		propertyClass: named,
		outer,
		hole,
		threadFriction,
		headFriction,
		torque: given,
		wanted
	}) {
		const mean = bearingMeanMm(outer, hole);
		if (!mean.ok) return mean;
		const thread = threadOf(d, p);
		if (!thread.ok) return thread;
		if ((given === undefined) === (wanted === undefined))
			return cannot('fill in the torque or the wanted preload, one of the two');
		const joint = {
			diameterMm: d,
			pitchMm: p,
			threadFriction,
			headFriction,
			bearingMeanMm: mean.value
		};
		const load =
			given === undefined ? computed((wanted ?? 0) * 1000) : preloadByFrictionN(given, joint);
		if (!load.ok) return load;
		const split = torqueByFriction(load.value, joint);
		if (!split.ok) return split;
		const strength = classStrength(named, d);
		const allowed = assemblyPreloadN(d, p, strength.yieldMPa, threadFriction);
		if (!allowed.ok) return allowed;
		const { torqueNm, shares, nutFactor } = split.value;
		const { pitchDiameterMm: d2 } = thread.value;
		const arms = `0.16 · ${p} + 0.58 · ${d2.toFixed(3)} · ${threadFriction} + ${mean.value} / 2 · ${headFriction}`;
		const kn = { unit: 'kN', decimals: 1 };
		const nm = { unit: 'N·m', decimals: 1 };
		const percent = (key: string, words: string, share: number) => ({
			key,
			words,
			value: share * 100,
			unit: '%',
			decimals: 1
		});
		return computed({
			lines: [
				given === undefined
					? { key: 'torque', words: 'Torque', value: torqueNm, ...nm, main: true }
					: { key: 'preload', words: 'Preload', value: load.value / 1000, ...kn, main: true },
				percent('pitch', 'Of the torque, into the bolt', shares.pitch),
				percent('thread', 'Eaten in the thread', shares.thread),
				percent('head', 'Eaten under the head', shares.head),
				{
					key: 'factor',
					words: 'Nut factor of this joint',
					value: nutFactor,
					unit: '',
					decimals: 3
				},
				{
					key: 'allowed',
					words: 'Preload at 90 % of yield while it is turned',
					value: allowed.value / 1000,
					...kn
				}
			],
			working: [
				{
					words: 'Mean bearing diameter',
					rule: 'Dkm = (dw + dh) / 2',
					formula: `(${outer} + ${hole}) / 2`,
					value: mean.value,
					unit: 'mm',
					decimals: 2
				},
				{
					words: 'Pitch diameter of the thread',
					rule: 'd2 = d − 0.649519 P',
					formula: `${d} − 0.649519 · ${p}`,
					value: d2,
					unit: 'mm',
					decimals: 3
				},
				given === undefined
					? {
							words: 'Torque',
							rule: 'M = F · (0.16 P + 0.58 d2 µG + Dkm/2 · µK)',
							formula: `${wanted} · (${arms})`,
							value: torqueNm,
							...nm
						}
					: {
							words: 'Preload',
							rule: 'F = M / (0.16 P + 0.58 d2 µG + Dkm/2 · µK)',
							formula: `${given} / (${arms})`,
							value: load.value / 1000,
							...kn
						},
				{
					words: 'Of the torque, into the bolt',
					rule: '0.16 P / (0.16 P + 0.58 d2 µG + Dkm/2 · µK)',
					formula: `0.16 · ${p} / (${arms})`,
					value: shares.pitch * 100,
					unit: '%',
					decimals: 1
				}
			],
			notes:
				load.value > allowed.value
					? [
							'More than 90 % of yield while the wrench turns it: the thread’s torsion comes on top of the pull.'
						]
					: [],
			drawing: { kind: 'torque-shares', torqueNm, preloadN: load.value, shares }
		});
	},
	presets: (sheet) =>
		boltPresets(sheet, (bolt) => {
			const last = lastTorqueNm(bolt);
			return last === undefined
				? undefined
				: {
						diameter: String(bolt.thread.diameterMm),
						pitch: String(bolt.thread.pitchMm),
						propertyClass: bolt.propertyClass,
						torque: String(last),
						wanted: ''
					};
		})
});
