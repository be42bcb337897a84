import { middleNutFactor } from '$lib/kernel/fasteners/nut-factor';
import { clampLoadN, loadShare, preloadN, torqueForPreloadNm } from '$lib/kernel/fasteners/preload';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { number } from '../field';
import type { ResultLine } from '../worked';
import { boltFields, factorFields, factorSource, loadFields } from './fasteners/bolt-fields';
import { boltOf, loadSteps, type Bolt } from './fasteners/bolt';
import { boltPresets, factorValues, lastTorqueNm } from './fasteners/bolt-presets';
import { plain } from './formula-figures';

const kn = { unit: 'kN', decimals: 1 };
const nm = { unit: 'N·m', decimals: 1 };
const percent = { unit: '%', decimals: 0 };

/** Torque to preload and back by a nut factor, between its least and its most. */
export const preload = calculator({
	key: 'preload',
	title: 'Torque and preload',
	says: 'How hard a torque pulls a bolt, or which torque a wanted pull takes, between the least and the most that the nut factor may be.',
	drawer: 'fasteners',
	caution:
		'A torque wrench scatters by about a quarter, more on a dry or dirty thread. A bolt that is pulled past its proof load is not used again.',
	formulas: [
		'fasteners/preload',
		'fasteners/torque-for-preload',
		'fasteners/middle-nut-factor',
		'fasteners/clamp-load',
		'fasteners/load-share',
		'fasteners/bolt-loads',
		'fasteners/grade-loads'
	],
	sources: [factorSource],
	fields: {
		...boltFields,
		...factorFields,
		...loadFields('50'),
		share: number({
			words: 'Wanted share of the proof load, %',
			hint: 'In place of a preload. Textbooks take 75 where a joint is taken apart again, 90 where it stays.',
			least: 1,
			most: 100,
			optional: true,
			example: ''
		})
	},
	work({ leastFactor, mostFactor, torque, wanted, share, ...typed }) {
		const bolt = boltOf(typed);
		if (!bolt.ok) return bolt;
		if (mostFactor < leastFactor) return cannot('the least nut factor lies above the most');
		if ([torque, wanted, share].filter((one) => one !== undefined).length !== 1)
			return cannot('fill in the torque, the wanted preload or the wanted share, one of the three');
		const range = { least: leastFactor, most: mostFactor };
		const set =
			torque === undefined
				? torqueFor(bolt.value, range, wanted, share)
				: computed({ torqueNm: torque, lines: [], steps: [] });
		if (!set.ok) return set;
		const { torqueNm, lines, steps } = set.value;
		const diameterMm = typed.diameter;
		const most = preloadN(torqueNm, leastFactor, diameterMm);
		const least = preloadN(torqueNm, mostFactor, diameterMm);
		if (!most.ok) return most;
		if (!least.ok) return least;
		const { proofN, yieldN, tensileN } = bolt.value.loads;
		const shares = [loadShare(most.value, proofN), loadShare(least.value, proofN)] as const;
		if (!shares[0].ok) return shares[0];
		if (!shares[1].ok) return shares[1];
		const pull = (words: string, k: number, value: number): Step => ({
			words,
			rule: 'F = T / (K · d)',
			formula: `${plain(torqueNm)} / (${plain(k)} · ${plain(diameterMm)})`,
			value: value / 1000,
			...kn
		});
		const one = least.value === most.value;
		return computed({
			lines: [
				...lines,
				{
					key: 'most',
					words: one ? 'Preload' : 'Preload, if the thread is slippery',
					value: most.value / 1000,
					...kn,
					main: true
				},
				...(one
					? []
					: [
							{
								key: 'least',
								words: 'Preload, if the thread drags',
								value: least.value / 1000,
								...kn,
								main: true
							}
						]),
				{
					key: 'share',
					words: one ? 'Of the proof load' : 'Of the proof load, at most',
					value: 100 * shares[0].value,
					...percent
				},
				...(one
					? []
					: [
							{
								key: 'least-share',
								words: 'Of the proof load, at least',
								value: 100 * shares[1].value,
								...percent
							}
						]),
				{ key: 'proof', words: 'Proof load of the bolt', value: proofN / 1000, ...kn }
			],
			working: [
				...bolt.value.areaSteps,
				...loadSteps(bolt.value, typed.propertyClass, ['proof']),
				...steps,
				...(one
					? [pull('Preload by the nut factor', leastFactor, most.value)]
					: [
							pull('Slippery: the least nut factor pulls hardest', leastFactor, most.value),
							pull('Dragging: the most nut factor pulls least', mostFactor, least.value)
						]),
				{
					words: one ? 'Against the proof load' : 'The hardest pull against the proof load',
					rule: 's = F / Fp',
					formula: `100 · ${(most.value / 1000).toFixed(1)} / ${(proofN / 1000).toFixed(1)}`,
					value: 100 * shares[0].value,
					...percent
				}
			],
			notes: loadNotes(bolt.value, most.value),
			drawing: {
				kind: 'bolt-load',
				leastN: least.value,
				mostN: most.value,
				proofN,
				yieldN,
				tensileN
			}
		});
	},
	presets: (sheet) =>
		boltPresets(sheet, (bolt) => {
			const last = lastTorqueNm(bolt);
			return last === undefined
				? undefined
				: { ...factorValues(bolt), torque: String(last), wanted: '', share: '' };
		})
});

type SetTorque = { torqueNm: number; lines: ResultLine[]; steps: Step[] };

/** The torque that a wanted pull takes, by the middle of the nut factors. */
function torqueFor(
	{ loads, thread }: Bolt,
	range: { least: number; most: number },
	wantedKn: number | undefined,
	share: number | undefined
): Outcome<SetTorque> {
	const wanted =
		wantedKn === undefined
			? clampLoadN((share ?? 0) / 100, loads.proofN)
			: computed(wantedKn * 1000);
	if (!wanted.ok) return wanted;
	const middle = middleNutFactor(range);
	if (!middle.ok) return middle;
	const torque = torqueForPreloadNm(wanted.value, middle.value, thread.diameterMm);
	if (!torque.ok) return torque;
	// A torque is set to a whole tenth: what it gives is told of the figure that is set.
	const torqueNm = Number(torque.value.toFixed(torque.value < 1 ? 3 : 1));
	const pulled = `${plain(wanted.value / 1000)}`;
	return computed({
		torqueNm,
		lines: [{ key: 'torque', words: 'Torque to set', value: torqueNm, ...nm, main: true }],
		steps: [
			...(wantedKn === undefined
				? [
						{
							words: 'Wanted preload',
							rule: 'F = s · Fp',
							formula: `${plain(share ?? 0)} / 100 · ${(loads.proofN / 1000).toFixed(1)}`,
							value: wanted.value / 1000,
							...kn
						}
					]
				: []),
			{
				words: 'Nut factor, the middle of the two',
				rule: 'K = (least + most) / 2',
				formula: `(${plain(range.least)} + ${plain(range.most)}) / 2`,
				value: middle.value,
				unit: '',
				decimals: 3
			},
			{
				words: 'Torque to set',
				rule: 'T = K · d · F',
				formula: `${plain(middle.value)} · ${plain(thread.diameterMm)} · ${pulled}`,
				value: torqueNm,
				...nm
			}
		]
	});
}

function loadNotes({ loads }: Bolt, mostN: number): string[] {
	if (mostN > loads.tensileN)
		return ['The slipperiest bolt would part: this torque is not for this bolt.'];
	if (mostN > loads.yieldN)
		return ['The slipperiest bolt is drawn past yield, and by torque alone nobody knows how far.'];
	if (mostN > loads.proofN)
		return ['The slipperiest bolt is pulled past its proof load: it is not used again.'];
	return [];
}
