import { preloadN, torqueForPreloadNm } from '$lib/kernel/fasteners/preload';
import { boltLoads } from '$lib/kernel/fasteners/proof-load';
import { cannot, computed } from '$lib/kernel/outcome';
import { nutFactorOf } from '../../data-sheets/nut-factors';
import { calculator } from '../calculator';
import { number, quantity } from '../field';
import {
	boltPresets,
	diameter,
	force,
	lastTorqueNm,
	pitch,
	propertyClass,
	torque
} from './fasteners/bolt-fields';

/** Torque to preload and back by a nut factor, between its least and its most. */
export const preload = calculator({
	key: 'preload',
	title: 'Torque and preload',
	says: 'How hard a torque pulls a bolt, or which torque a wanted pull takes, between the least and the most that the nut factor may be.',
	drawer: 'fasteners',
	caution:
		'A torque wrench scatters by about a quarter, more on a dry or dirty thread. A bolt that is pulled past its proof load is not used again.',
	formulas: ['fasteners/preload', 'fasteners/torque-for-preload', 'fasteners/bolt-loads'],
	sources: [
		'Nut factors of textbooks and supplier tables: dry steel 0.20 to 0.25, engine oil 0.15 to 0.20, anti-seize compound 0.12 to 0.16, waxed about 0.10. They differ between sources.'
	],
	fields: {
		diameter,
		pitch,
		propertyClass,
		leastFactor: number({
			words: 'Nut factor K, least',
			hint: 'Engine oil 0.15, anti-seize 0.12, dry 0.20.',
			least: 0.03,
			most: 0.6,
			example: '0.15'
		}),
		mostFactor: number({
			words: 'Nut factor K, most',
			hint: 'Engine oil 0.20, anti-seize 0.16, dry 0.25.',
			least: 0.03,
			most: 0.6,
			example: '0.20'
		}),
		torque: quantity({
			...torque,
			words: 'Torque',
			hint: 'Fill in this, or the wanted preload.',
			least: 0.01,
			most: 20_000,
			optional: true,
			example: '50'
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
		leastFactor,
		mostFactor,
		torque: given,
		wanted
	}) {
		const loads = boltLoads(d, p, named);
		if (!loads.ok) return loads;
		if (mostFactor < leastFactor) return cannot('the least nut factor lies above the most');
		if ((given === undefined) === (wanted === undefined))
			return cannot('fill in the torque or the wanted preload, one of the two');
		const { proofN, yieldN, tensileN } = loads.value;
		const factors = [leastFactor, mostFactor] as const;
		const kn = { unit: 'kN', decimals: 1 };
		if (given !== undefined) {
			const [most, least] = factors.map((k) => preloadN(given, k, d));
			if (!most?.ok) return most ?? cannot('no nut factor');
			if (!least?.ok) return least ?? cannot('no nut factor');
			const step = (words: string, k: number, value: number) => ({
				words,
				rule: 'F = T / (K · d)',
				formula: `${given} / (${k} · ${d / 1000}) / 1000`,
				value: value / 1000,
				...kn
			});
			return computed({
				lines: [
					{ key: 'most', words: 'Preload, most', value: most.value / 1000, ...kn, main: true },
					{ key: 'least', words: 'Preload, least', value: least.value / 1000, ...kn, main: true },
					{
						key: 'share',
						words: 'Most of it against the proof load',
						value: (100 * most.value) / proofN,
						unit: '%',
						decimals: 0
					},
					{ key: 'proof', words: 'Proof load of the bolt', value: proofN / 1000, ...kn }
				],
				working: [
					step('Slipperiest: the least nut factor pulls hardest', leastFactor, most.value),
					step('Driest: the most nut factor pulls least', mostFactor, least.value)
				],
				notes: loadNotes(most.value, proofN, yieldN),
				drawing: {
					kind: 'bolt-load',
					leastN: least.value,
					mostN: most.value,
					proofN,
					yieldN,
					tensileN
				}
			});
		}
		const preloadNewtons = (wanted ?? 0) * 1000;
		const [least, most] = factors.map((k) => torqueForPreloadNm(preloadNewtons, k, d));
		if (!most?.ok) return most ?? cannot('no nut factor');
		if (!least?.ok) return least ?? cannot('no nut factor');
		const nm = { unit: 'N·m', decimals: 1 };
		const step = (words: string, k: number, value: number) => ({
			words,
			rule: 'T = K · d · F',
			formula: `${k} · ${d / 1000} · ${preloadNewtons}`,
			value,
			...nm
		});
		return computed({
			lines: [
				{
					key: 'torque-least',
					words: 'Torque, if the thread is slippery',
					value: least.value,
					...nm,
					main: true
				},
				{
					key: 'torque-most',
					words: 'Torque, if the thread is dry',
					value: most.value,
					...nm,
					main: true
				},
				{ key: 'proof', words: 'Proof load of the bolt', value: proofN / 1000, ...kn }
			],
			working: [
				step('By the least nut factor', leastFactor, least.value),
				step('By the most nut factor', mostFactor, most.value)
			],
			notes: loadNotes(preloadNewtons, proofN, yieldN),
			drawing: {
				kind: 'bolt-load',
				leastN: preloadNewtons,
				mostN: preloadNewtons,
				proofN,
				yieldN,
				tensileN
			}
		});
	},
	presets: (sheet) =>
		boltPresets(sheet, (bolt) => {
			const last = lastTorqueNm(bolt);
			if (last === undefined) return undefined;
			const factor = nutFactorOf(bolt);
			return {
				diameter: String(bolt.thread.diameterMm),
				pitch: String(bolt.thread.pitchMm),
				propertyClass: bolt.propertyClass,
				leastFactor: String(factor.least),
				mostFactor: String(factor.most),
				torque: String(last),
				wanted: ''
			};
		})
});

function loadNotes(mostN: number, proofN: number, yieldN: number): string[] {
	if (mostN > yieldN) return ['Past yield: the bolt is drawn for good, and is fitted once only.'];
	if (mostN > proofN)
		return ['Past the proof load: the bolt may not spring back, and is not used again.'];
	return [];
}
