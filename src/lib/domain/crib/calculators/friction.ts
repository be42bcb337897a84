import { assemblyPreloadN } from '$lib/kernel/fasteners/assembly-preload';
import {
	bearingMeanMm,
	preloadByFrictionN,
	torqueByFriction,
	type TorqueSplit
} from '$lib/kernel/fasteners/friction';
import type { FrictionJoint } from '$lib/kernel/fasteners/friction-arms';
import { loadShare } from '$lib/kernel/fasteners/preload';
import { screwTorqueNm } from '$lib/kernel/fasteners/screw-torque';
import { cannot, computed } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { number, quantity } from '../field';
import { boltOf } from './fasteners/bolt';
import { boltFields, coefficient, length, loadFields } from './fasteners/bolt-fields';
import { boltPresets, lastTorqueNm } from './fasteners/bolt-presets';
import { plain } from './formula-figures';

const kn = { unit: 'kN', decimals: 1 };
const nm = { unit: 'N·m', decimals: 1 };
const mm = { unit: 'mm', decimals: 3 };

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
		'fasteners/screw-torque',
		'fasteners/assembly-preload',
		'fasteners/load-share'
	],
	fields: {
		...boltFields,
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
		...loadFields('70')
	},
	work({ outer, hole, threadFriction, headFriction, torque, wanted, ...typed }) {
		const bolt = boltOf(typed);
		if (!bolt.ok) return bolt;
		const mean = bearingMeanMm(outer, hole);
		if (!mean.ok) return mean;
		if ((torque === undefined) === (wanted === undefined))
			return cannot('fill in the torque or the wanted preload, one of the two');
		const { geometry, loads, strength } = bolt.value;
		const joint = {
			diameterMm: geometry.diameterMm,
			pitchMm: geometry.pitchMm,
			threadFriction,
			headFriction,
			bearingMeanMm: mean.value
		};
		const load =
			torque === undefined ? computed((wanted ?? 0) * 1000) : preloadByFrictionN(torque, joint);
		if (!load.ok) return load;
		const split = torqueByFriction(load.value, joint);
		if (!split.ok) return split;
		const whole = screwTorqueNm(load.value, joint);
		if (!whole.ok) return whole;
		const used = loadShare(load.value, loads.proofN);
		if (!used.ok) return used;
		const allowed = assemblyPreloadN(
			geometry.diameterMm,
			geometry.pitchMm,
			strength.yieldMPa,
			threadFriction
		);
		if (!allowed.ok) return allowed;
		const { torqueNm, shares, nutFactor } = split.value;
		return computed({
			lines: [
				torque === undefined
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
				percent('used', 'Preload, of the proof load', used.value),
				{
					key: 'allowed',
					words: 'Preload at 90 % of yield while it is turned',
					value: allowed.value / 1000,
					...kn
				},
				{ key: 'whole', words: 'Torque by the whole screw formula', value: whole.value, ...nm }
			],
			working: [
				{
					words: 'Mean bearing diameter',
					rule: 'Dkm = (dw + dh) / 2',
					formula: `(${plain(outer)} + ${plain(hole)}) / 2`,
					value: mean.value,
					unit: 'mm',
					decimals: 2
				},
				...steps(joint, split.value, geometry.pitchDiameterMm),
				torque === undefined
					? {
							words: 'Torque: the preload times the three together',
							rule: 'M = F · (0.16 P + 0.58 d2 µG + Dkm/2 · µK)',
							formula: `${plain(wanted ?? 0)} · (${threeArms(split.value)})`,
							value: torqueNm,
							...nm
						}
					: {
							words: 'Preload: the torque over the three together',
							rule: 'F = M / (0.16 P + 0.58 d2 µG + Dkm/2 · µK)',
							formula: `${plain(torque)} / (${threeArms(split.value)})`,
							value: load.value / 1000,
							...kn
						},
				...shareSteps(split.value),
				{
					words: 'Nut factor of this joint',
					rule: 'K = (0.16 P + 0.58 d2 µG + Dkm/2 · µK) / d',
					formula: `(${threeArms(split.value)}) / ${plain(geometry.diameterMm)}`,
					value: nutFactor,
					unit: '',
					decimals: 3
				}
			],
			notes: notesOf(load.value, allowed.value, loads.proofN),
			drawing: { kind: 'torque-shares', torqueNm, preloadN: load.value, shares }
		});
	},
	presets: (sheet) =>
		boltPresets(sheet, (bolt) => {
			const last = lastTorqueNm(bolt);
			return last === undefined ? undefined : { torque: String(last), wanted: '' };
		})
});

function percent(key: string, words: string, share: number) {
	return { key, words, value: share * 100, unit: '%', decimals: 1 };
}

function threeArms({ arms }: TorqueSplit): string {
	return [arms.pitch, arms.thread, arms.head].map((one) => one.toFixed(3)).join(' + ');
}

/** What each of the three takes for one newton of pull. */
function steps(joint: FrictionJoint, { arms }: TorqueSplit, pitchDiameterMm: number): Step[] {
	return [
		{
			words: 'Pitch diameter of the thread',
			rule: 'd2 = d − 0.649519 P',
			formula: `${plain(joint.diameterMm)} − 0.649519 · ${plain(joint.pitchMm)}`,
			value: pitchDiameterMm,
			...mm
		},
		{
			words: 'Taken by the pitch for each newton of pull',
			rule: '0.16 P',
			formula: `0.16 · ${plain(joint.pitchMm)}`,
			value: arms.pitch,
			...mm
		},
		{
			words: 'Taken by the thread’s friction',
			rule: '0.58 d2 µG',
			formula: `0.58 · ${pitchDiameterMm.toFixed(3)} · ${plain(joint.threadFriction)}`,
			value: arms.thread,
			...mm
		},
		{
			words: 'Taken by the friction under the head',
			rule: 'Dkm/2 · µK',
			formula: `${plain(joint.bearingMeanMm)} / 2 · ${plain(joint.headFriction)}`,
			value: arms.head,
			...mm
		}
	];
}

function shareSteps(split: TorqueSplit): Step[] {
	const { arms, shares } = split;
	return [
		{ words: 'Of the torque, into the bolt', arm: arms.pitch, share: shares.pitch },
		{ words: 'Eaten in the thread', arm: arms.thread, share: shares.thread },
		{ words: 'Eaten under the head', arm: arms.head, share: shares.head }
	].map(({ words, arm, share }) => ({
		words,
		rule: 'its part / the three together',
		formula: `100 · ${arm.toFixed(3)} / (${threeArms(split)})`,
		value: share * 100,
		unit: '%',
		decimals: 1
	}));
}

function notesOf(loadN: number, allowedN: number, proofN: number): string[] {
	if (loadN > allowedN)
		return [
			'More than 90 % of yield while the wrench turns it: the thread’s torsion comes on top of the pull.'
		];
	return loadN > proofN ? ['Past the proof load: the bolt is not used again.'] : [];
}
