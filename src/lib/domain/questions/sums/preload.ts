import { z } from 'zod';
import { tabledAreaMm2 } from '$lib/kernel/fasteners/bolt-thread';
import { boltLoads } from '$lib/kernel/fasteners/proof-load';
import { classStrength } from '$lib/kernel/fasteners/strength';
import { cannot, computed } from '$lib/kernel/outcome';
import { preload as calculator } from '../../crib/calculators/preload';
import { sheetKeySchema } from '../words';
import { drawFactor, finalTorqueOf } from './draw-bolt';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const preloadParameters = z.strictObject({
	/** A tightening with a torque stage. */
	tightening: sheetKeySchema,
	/** The pull of a torque, what share of the proof load it is, or the torque for a wanted pull. */
	ask: z.enum(['preload', 'share', 'torque'])
});

/**
 * Torque and preload of a bolt of the data sheet by a nut factor within its lubrication, to a
 * hundredth. The wrench is set to within a fifth of the printed torque, to a whole newton metre; a
 * wanted pull is 45 to 75 % of the proof load, to a whole kilonewton.
 */
export const preload = sumOf({
	calculator,
	parameters: preloadParameters,
	sheetKeys: ({ tightening }) => [tightening],
	draw({ tightening, ask }, random, sheet) {
		const found = sheet.tightening(tightening);
		if (!found.ok) return found;
		const bolt = found.value;
		const printed = finalTorqueOf(bolt);
		if (!printed.ok) return printed;
		const { threadDiameterMm: d, threadPitchMm: p, propertyClass } = bolt;
		const loads = boltLoads(d, p, propertyClass);
		if (!loads.ok) return loads;
		const area = tabledAreaMm2({ diameterMm: d, pitchMm: p });
		if (!area.ok) return area;
		const factor = drawFactor(bolt, random);
		const set = Math.round(random.between(0.8, 1.2) * printed.value);
		const wanted = Math.round((random.between(0.45, 0.75) * loads.value.proofN) / 1000);
		if (set < 2 || wanted < 1) return cannot(`${bolt.words} is too small to ask about`);
		const given = [
			{ words: `${bolt.words}, diameter`, value: d, unit: 'mm', decimals: 0 },
			{ words: 'Nut factor', value: factor, unit: '', decimals: 2 }
		];
		return computed({
			values: {
				diameter: d,
				pitch: p,
				threads: undefined,
				propertyClass,
				leastFactor: factor,
				mostFactor: factor,
				torque: ask === 'torque' ? undefined : set,
				wanted: ask === 'torque' ? wanted : undefined,
				share: undefined
			},
			ask: ask === 'preload' ? 'most' : ask,
			given: [
				...given,
				ask === 'torque'
					? { words: 'Wanted preload', value: wanted, unit: 'kN', decimals: 0 }
					: { words: 'Torque that the wrench was set to', value: set, unit: 'N·m', decimals: 0 },
				...(ask === 'share'
					? [
							{ words: 'Stress area', value: shown(area.value, 1), unit: 'mm²', decimals: 1 },
							{
								words: `Proof stress of class ${propertyClass}`,
								value: classStrength(propertyClass, d).proofMPa,
								unit: 'N/mm²',
								decimals: 0
							}
						]
					: [])
			],
			prompt: prompts[ask]
		});
	}
});

const prompts: Record<z.infer<typeof preloadParameters>['ask'], string> = {
	preload: 'How hard does this bolt pull, by its nut factor?',
	share: 'How much of its proof load does this bolt’s pull use up, in per cent, by its nut factor?',
	torque: 'Which torque is set on the wrench for this pull, by the nut factor?'
};
