import { sixLobeAcrossMm, sixLobeSockets, threadsOfSixLobe } from '$lib/kernel/fasteners/six-lobe';
import { seriesOf, unifiedThreads } from '$lib/kernel/fasteners/standard-pitches';
import { computed } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { words } from '../field';
import type { ResultLine } from '../worked';
import { boltOf, loadSteps, type Bolt } from './fasteners/bolt';
import { boltFields } from './fasteners/bolt-fields';
import { boltPresets } from './fasteners/bolt-presets';
import { plain } from './formula-figures';

const kn = { unit: 'kN', decimals: 1 };
const mm = { unit: 'mm', decimals: 3 };

/** What a bolt is and bears. */
export const thread = calculator({
	key: 'thread',
	title: 'Thread and strength',
	says: 'Stress area, proof, yield and tensile load of a bolt, its thread’s diameters, and the external six-lobe socket that usually fits it.',
	drawer: 'fasteners',
	caution:
		'A head without a class is not counted as a strong one. Never replace a bolt by one of a lower class, nor a fine thread by a coarse one. A socket that rocks on its head rounds the lobes: try the next size.',
	formulas: [
		'fasteners/thread',
		'fasteners/stress-area',
		'fasteners/stress-area-unified',
		'fasteners/bolt-loads',
		'fasteners/grade-loads'
	],
	sources: [
		'Coarse and fine pitches: ISO 262; unified threads: ASME B1.1.',
		'External six-lobe sockets by thread: common practice, no source; makers pair them differently. An outside drive (E) is no inside drive (T) of the same number.'
	],
	fields: {
		...boltFields,
		socket: words({
			words: 'External six-lobe socket',
			hint: 'Such as E12: tells on which threads it is usually found.',
			most: 4,
			optional: true,
			example: ''
		})
	},
	work({ socket, ...typed }) {
		const found = boltOf(typed);
		if (!found.ok) return found;
		const bolt = found.value;
		const { areaMm2, proofN, yieldN, tensileN } = bolt.loads;
		const { diameterMm, pitchMm, pitchDiameterMm, rootDiameterMm, minorDiameterMm, leadAngleDeg } =
			bolt.geometry;
		const lines: ResultLine[] = [
			{ key: 'area', words: 'Stress area', value: areaMm2, unit: 'mm²', decimals: 1, main: true },
			{ key: 'proof', words: 'Proof load', value: proofN / 1000, ...kn, main: true },
			{ key: 'yield', words: 'Load at yield', value: yieldN / 1000, ...kn },
			{ key: 'tensile', words: 'Least tensile load', value: tensileN / 1000, ...kn },
			{ key: 'pitch-diameter', words: 'Pitch diameter', value: pitchDiameterMm, ...mm },
			{ key: 'root', words: 'Root diameter of the bolt', value: rootDiameterMm, ...mm },
			{ key: 'minor', words: 'Minor diameter of the nut', value: minorDiameterMm, ...mm },
			{ key: 'lead', words: 'Lead angle', value: leadAngleDeg, unit: '°', decimals: 2 },
			{ key: 'series', words: `${bolt.name} is`, text: seriesWords(bolt) },
			{
				key: 'socket',
				words: 'External six-lobe socket, usually',
				text: socketWords(sixLobeSockets(diameterMm))
			},
			...(socket ? [threadsLine(socket)] : [])
		];
		return computed({
			lines,
			working: [
				...diameterSteps(bolt),
				...bolt.areaSteps,
				...loadSteps(bolt, typed.propertyClass, ['proof', 'yield', 'tensile'])
			],
			notes:
				sixLobeSockets(diameterMm).length > 0
					? [
							'The socket is common practice and differs between makers and between plain and flanged heads: try it on the head.'
						]
					: [],
			drawing: {
				kind: 'thread-profile',
				diameterMm,
				pitchMm,
				pitchDiameterMm,
				rootDiameterMm,
				name: bolt.name
			}
		});
	},
	presets: (sheet) => boltPresets(sheet, () => ({}))
});

function seriesWords({ thread: of }: Bolt): string {
	if (of.threadsPerInch === undefined)
		return seriesOf(of.diameterMm, of.pitchMm) ?? 'of neither usual series: measure it again';
	const usual = unifiedThreads(of.diameterMm / 25.4);
	if (usual?.coarse === of.threadsPerInch) return 'coarse (UNC)';
	return usual?.fine === of.threadsPerInch
		? 'fine (UNF)'
		: 'of neither usual series: measure it again';
}

function socketWords(sockets: readonly string[]): string {
	if (sockets.length === 0) return 'none listed for this size';
	return sockets
		.map((one) => {
			const across = sixLobeAcrossMm(one);
			return across === undefined ? one : `${one} (${across} mm across)`;
		})
		.join(' or ');
}

function threadsLine(typed: string): ResultLine {
	const socket = typed.toUpperCase().replace(/^(?=\d)/, 'E');
	const threads = threadsOfSixLobe(socket);
	return {
		key: 'threads',
		words: `${socket} is usually found on`,
		text:
			threads.length === 0 ? 'no thread of the list' : threads.map((one) => `M${one}`).join(' or ')
	};
}

function diameterSteps({ geometry: of }: Bolt): Step[] {
	const [d, p] = [plain(of.diameterMm), plain(of.pitchMm)];
	return [
		{
			words: 'Pitch diameter',
			rule: 'd2 = d − 0.649519 P',
			formula: `${d} − 0.649519 · ${p}`,
			value: of.pitchDiameterMm,
			...mm
		},
		{
			words: 'Root diameter',
			rule: 'd3 = d − 1.226869 P',
			formula: `${d} − 1.226869 · ${p}`,
			value: of.rootDiameterMm,
			...mm
		},
		{
			words: 'Minor diameter of the nut',
			rule: 'D1 = d − 1.082532 P',
			formula: `${d} − 1.082532 · ${p}`,
			value: of.minorDiameterMm,
			...mm
		},
		{
			words: 'Lead angle',
			rule: 'φ = atan(P / (π · d2))',
			formula: `atan(${p} / (π · ${of.pitchDiameterMm.toFixed(3)}))`,
			value: of.leadAngleDeg,
			unit: '°',
			decimals: 2
		}
	];
}
