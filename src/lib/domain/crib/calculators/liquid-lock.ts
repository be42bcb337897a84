import { clearanceForCm3 } from '$lib/kernel/cylinder/compression-ratio';
import { discHeightMm } from '$lib/kernel/cylinder/disc-volume';
import { displacementCm3 } from '$lib/kernel/cylinder/displacement';
import { crankAngleAtDeg, liquidLock as lockOf } from '$lib/kernel/cylinder/liquid-lock';
import { computed } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { number, quantity } from '../field';
import type { ResultLine } from '../worked';
import { boreRange, cm3, length, middleOf, stated, strokeRange, volume } from './cylinder/faces';
import { figure, plain } from './formula-figures';
import { allOf } from './temperature/all-of';

/** Where trapped liquid stops a piston. */
export const liquidLock = calculator({
	key: 'liquid-lock',
	title: 'Liquid lock',
	says: 'How much water, oil or fuel stops a piston before top dead centre, and where on its stroke.',
	drawer: 'cylinder',
	caution:
		'Never turn an engine that may hold liquid by its starter: take plugs or injectors out, turn it by hand, and stand clear of the holes. After a lock, every rod is checked for length, bend and twist before it runs again.',
	formulas: [
		'cylinder/displacement',
		'cylinder/clearance-for',
		'cylinder/liquid-lock',
		'cylinder/crank-angle'
	],
	fields: {
		bore: quantity({ ...length, ...boreRange, words: 'Bore', example: '86' }),
		stroke: quantity({ ...length, ...strokeRange, words: 'Stroke', example: '94.6' }),
		ratio: number({ words: 'Compression ratio, to 1', least: 1.5, most: 40, example: '20.5' }),
		liquid: quantity({
			...volume,
			words: 'Liquid above the piston',
			hint: 'What was sucked out, or what is missing elsewhere.',
			least: 0,
			most: 500_000,
			example: '60'
		}),
		rod: quantity({
			...length,
			words: 'Connecting rod, centre to centre',
			hint: 'With it, the crank angle.',
			least: 5,
			most: 10_000,
			optional: true,
			example: '150'
		})
	},
	work({ bore, stroke, ratio, liquid, rod }) {
		const sweptCm3 = displacementCm3(bore, stroke);
		const clearance = clearanceForCm3(sweptCm3, ratio);
		if (!clearance.ok) return clearance;
		const found = lockOf(liquid, clearance.value, bore);
		if (!found.ok) return found;
		const heights = allOf({
			clearance: discHeightMm(clearance.value, bore),
			liquid: discHeightMm(liquid, bore)
		});
		if (!heights.ok) return heights;
		const { locks, roomCm3, belowTdcMm } = found.value;
		// More than the whole cylinder holds cannot have been there while the piston came up.
		const within = belowTdcMm <= stroke;
		const angle =
			rod !== undefined && locks && within ? crankAngleAtDeg(stroke, rod, belowTdcMm) : undefined;
		if (angle && !angle.ok) return angle;
		const crank = { unit: '°', decimals: 0 };
		const lines: ResultLine[] = [
			{
				key: 'verdict',
				words: 'The piston',
				text: locks ? 'is stopped before top dead centre' : 'passes top dead centre',
				main: true
			},
			{
				key: 'clearance',
				words: 'Liquid that just locks it',
				value: clearance.value,
				...cm3,
				main: true
			},
			locks
				? {
						key: 'below',
						words: 'Stopped below top dead centre by',
						value: belowTdcMm,
						unit: 'mm',
						decimals: 2
					}
				: { key: 'room', words: 'More would still go in', value: roomCm3, ...cm3 },
			...(angle
				? [{ key: 'angle', words: 'Crank, before top dead centre', value: angle.value, ...crank }]
				: [])
		];
		const working: Step[] = [
			{
				words: 'Swept volume, lengths in cm',
				rule: 'Vs = π/4 · B² · S',
				formula: `π/4 · ${plain(bore / 10)}² · ${plain(stroke / 10)}`,
				value: sweptCm3,
				...cm3
			},
			{
				words: 'Clearance volume: as much liquid just locks it',
				rule: 'Vc = Vs / (ε − 1)',
				formula: `${figure(sweptCm3, 2)} / (${plain(ratio)} − 1)`,
				value: clearance.value,
				...cm3
			},
			locks
				? {
						words: 'What does not fit, spread over the piston',
						rule: 'x = (q − Vc) / (π/4 · B²)',
						formula: `(${figure(liquid, 2)} − ${figure(clearance.value, 2)}) · 1000 / (π/4 · ${plain(bore)}²)`,
						value: belowTdcMm,
						unit: 'mm',
						decimals: 2
					}
				: {
						words: 'All of it fits',
						rule: 'room = Vc − q',
						formula: `${figure(clearance.value, 2)} − ${figure(liquid, 2)}`,
						value: roomCm3,
						...cm3
					},
			...(angle && rod !== undefined
				? [
						{
							words: 'Crank angle there, by the triangle of crank, rod and centre line',
							rule: 'cos φ = (r² + (r + L − x)² − L²) / (2 · r · (r + L − x)), r = S/2',
							formula: `r = ${plain(stroke / 2)}, L = ${plain(rod)}, x = ${figure(belowTdcMm, 2)}`,
							value: angle.value,
							...crank
						}
					]
				: [])
		];
		return computed({
			lines,
			working,
			notes: within
				? []
				: [
						'That is more than the whole cylinder holds: the rest lay in the ports or came in while they were open. It locks at once.'
					],
			drawing: {
				kind: 'liquid-lock',
				boreMm: bore,
				strokeMm: stroke,
				clearanceMm: heights.value.clearance,
				liquidMm: heights.value.liquid,
				belowMm: within ? belowTdcMm : stroke,
				locks,
				liquidCm3: liquid,
				...(rod === undefined ? {} : { rodMm: rod }),
				...(angle ? { crankDeg: angle.value } : {})
			}
		});
	},
	presets: (sheet) => {
		const values = stated({
			bore: middleOf(sheet, 'cylinder.bore'),
			stroke: middleOf(sheet, 'crankshaft.stroke'),
			ratio: middleOf(sheet, 'cylinder.compressionRatio'),
			rod: middleOf(sheet, 'rod.length')
		});
		return values.bore && values.stroke
			? [{ key: 'cylinder.bore', words: 'One cylinder', values }]
			: [];
	}
});
