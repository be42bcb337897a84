import { boltLoads } from '$lib/kernel/fasteners/proof-load';
import { sixLobeAcrossMm, sixLobeSockets } from '$lib/kernel/fasteners/six-lobe';
import { coarsePitchMm } from '$lib/kernel/fasteners/standard-pitches';
import { threadOf } from '$lib/kernel/fasteners/thread';
import { computed } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import type { ResultLine } from '../worked';
import { boltPresets, diameter, pitch, propertyClass } from './fasteners/bolt-fields';

/** What a metric bolt is and bears. */
export const thread = calculator({
	key: 'thread',
	title: 'Thread and strength',
	says: 'Stress area, proof, yield and tensile load of a metric bolt, its thread’s diameters, and the external six-lobe socket that usually fits it.',
	drawer: 'fasteners',
	caution:
		'A head without a class is not counted as a strong one. Never replace a bolt by one of a lower class, nor a fine thread by a coarse one.',
	formulas: ['fasteners/thread', 'fasteners/stress-area', 'fasteners/bolt-loads'],
	sources: [
		'External six-lobe sockets by thread: stored tool tables, common practice; makers pair them differently. An outside drive (E) is no inside drive (T) of the same number.'
	],
	fields: { diameter, pitch, propertyClass },
	work({ diameter: d, pitch: p, propertyClass: named }) {
		const found = threadOf(d, p);
		if (!found.ok) return found;
		const loads = boltLoads(d, p, named);
		if (!loads.ok) return loads;
		const { areaMm2, proofN, yieldN, tensileN } = loads.value;
		const { pitchDiameterMm, rootDiameterMm, minorDiameterMm, leadAngleDeg } = found.value;
		const kn = { unit: 'kN', decimals: 1 };
		const mm = { unit: 'mm', decimals: 3 };
		const sockets = sixLobeSockets(d);
		const coarse = coarsePitchMm(d);
		const series =
			coarse === undefined
				? 'not of the usual series'
				: Math.abs(coarse - p) < 1e-6
					? 'coarse'
					: p < coarse
						? 'fine'
						: 'coarser than the series has it';
		const lines: ResultLine[] = [
			{ key: 'area', words: 'Stress area', value: areaMm2, unit: 'mm²', decimals: 1, main: true },
			{ key: 'proof', words: 'Proof load', value: proofN / 1000, ...kn, main: true },
			{ key: 'yield', words: 'Load at yield', value: yieldN / 1000, ...kn },
			{ key: 'tensile', words: 'Least tensile load', value: tensileN / 1000, ...kn },
			{ key: 'pitch-diameter', words: 'Pitch diameter', value: pitchDiameterMm, ...mm },
			{ key: 'root', words: 'Root diameter of the bolt', value: rootDiameterMm, ...mm },
			{ key: 'minor', words: 'Minor diameter of the nut', value: minorDiameterMm, ...mm },
			{ key: 'lead', words: 'Lead angle', value: leadAngleDeg, unit: '°', decimals: 2 },
			{ key: 'series', words: `M${d} × ${p} is`, text: series },
			{
				key: 'socket',
				words: 'External six-lobe socket, usually',
				text:
					sockets.length === 0
						? 'none listed for this size'
						: sockets
								.map((one) => {
									const across = sixLobeAcrossMm(one);
									return across === undefined ? one : `${one} (${across} mm across)`;
								})
								.join(' or ')
			}
		];
		return computed({
			lines,
			working: [
				{
					words: 'Pitch diameter',
					rule: 'd2 = d − 0.649519 P',
					formula: `${d} − 0.649519 · ${p}`,
					value: pitchDiameterMm,
					...mm
				},
				{
					words: 'Root diameter',
					rule: 'd3 = d − 1.226869 P',
					formula: `${d} − 1.226869 · ${p}`,
					value: rootDiameterMm,
					...mm
				},
				{
					words: 'Stress area, to three figures as the tables have it',
					rule: 'As = π/4 · ((d2 + d3)/2)²',
					formula: `π/4 · ((${pitchDiameterMm.toFixed(3)} + ${rootDiameterMm.toFixed(3)})/2)²`,
					value: areaMm2,
					unit: 'mm²',
					decimals: 1
				},
				{
					words: 'Proof load',
					rule: 'Fp = As · Sp',
					formula: `${areaMm2} · ${(proofN / areaMm2).toFixed(0)} / 1000`,
					value: proofN / 1000,
					...kn
				},
				{
					words: 'Least tensile load',
					rule: 'Fm = As · Rm',
					formula: `${areaMm2} · ${(tensileN / areaMm2).toFixed(0)} / 1000`,
					value: tensileN / 1000,
					...kn
				}
			],
			drawing: {
				kind: 'thread-profile',
				diameterMm: d,
				pitchMm: p,
				pitchDiameterMm,
				rootDiameterMm,
				name: `M${d} × ${p}`
			}
		});
	},
	presets: (sheet) =>
		boltPresets(sheet, (bolt) => ({
			diameter: String(bolt.thread.diameterMm),
			pitch: String(bolt.thread.pitchMm),
			propertyClass: bolt.propertyClass
		}))
});
