import { clearanceForCm3 } from '$lib/kernel/cylinder/compression-ratio';
import { displacementCm3 } from '$lib/kernel/cylinder/displacement';
import { crankAngleAtDeg, liquidLock as lockOf } from '$lib/kernel/cylinder/liquid-lock';
import { computed } from '$lib/kernel/outcome';
import { dimensionOf } from '../../data-sheets/value-of';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { number, quantity } from '../field';
import type { ResultLine } from '../worked';
import { figure } from './formula-figures';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;

/** Where trapped liquid stops a piston. */
export const liquidLock = calculator({
	key: 'liquid-lock',
	title: 'Liquid lock',
	says: 'How much water, oil or fuel stops a piston before top dead centre, and where on its stroke.',
	drawer: 'cylinder',
	caution:
		'Never turn an engine that may hold liquid by its starter: take the plugs or injectors out, turn it by hand, and stand clear of the holes.',
	formulas: [
		'cylinder/displacement',
		'cylinder/clearance-for',
		'cylinder/liquid-lock',
		'cylinder/crank-angle'
	],
	fields: {
		bore: quantity({ ...length, words: 'Bore', decimals: 2, least: 5, most: 2000, example: '86' }),
		stroke: quantity({
			...length,
			words: 'Stroke',
			decimals: 2,
			least: 5,
			most: 3000,
			example: '94.6'
		}),
		ratio: number({ words: 'Compression ratio, to 1', least: 1.5, most: 40, example: '20.5' }),
		liquid: quantity({
			dimension: 'volume',
			unit: { metric: 'cm³', inch: 'in³' },
			words: 'Liquid above the piston',
			decimals: 0,
			least: 0,
			most: 100_000,
			example: '40'
		}),
		rod: quantity({
			...length,
			words: 'Connecting rod, centre to centre',
			decimals: 1,
			least: 5,
			most: 5000,
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
		const { locks, belowTdcMm } = found.value;
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
				unit: 'cm³',
				decimals: 1,
				main: true
			},
			{
				key: 'below',
				words: 'Stopped below top dead centre by',
				value: belowTdcMm,
				unit: 'mm',
				decimals: 2
			}
		];
		const working: Step[] = [
			{
				words: 'Clearance volume',
				rule: 'Vc = Vs / (ε − 1)',
				formula: `${figure(sweptCm3, 1)} / (${ratio} − 1)`,
				value: clearance.value,
				unit: 'cm³',
				decimals: 1
			},
			{
				words: locks ? 'What does not fit, over the area of the piston' : 'All of it fits',
				rule: 'x = (q − Vc) / (π/4 · B²)',
				formula: locks
					? `(${figure(liquid, 1)} − ${figure(clearance.value, 1)}) · 1000 / (π/4 · ${figure(bore, 2)}²)`
					: `${figure(liquid, 1)} < ${figure(clearance.value, 1)}`,
				value: belowTdcMm,
				unit: 'mm',
				decimals: 2
			}
		];
		if (rod !== undefined && locks && belowTdcMm <= stroke) {
			const angle = crankAngleAtDeg(stroke, rod, belowTdcMm);
			if (!angle.ok) return angle;
			lines.push({
				key: 'angle',
				words: 'Crank angle before top dead centre',
				value: angle.value,
				unit: '°',
				decimals: 0
			});
		}
		return computed({
			lines,
			working,
			notes:
				belowTdcMm > stroke
					? [
							'More liquid than the whole cylinder holds: the rest came in by the ports while they were open.'
						]
					: [],
			drawing: {
				kind: 'cylinder-volumes',
				boreMm: bore,
				strokeMm: stroke,
				sweptCm3,
				parts: [
					{ words: 'clearance', cm3: clearance.value },
					{ words: 'liquid', cm3: liquid }
				]
			}
		});
	},
	presets: (sheet) => {
		const [bore, stroke, ratio, rod] = [
			'cylinder.bore',
			'crankshaft.stroke',
			'cylinder.compressionRatio',
			'rod.length'
		].map((key) => dimensionOf(sheet, key)?.nominal);
		if (!bore || !stroke) return [];
		return [
			{
				key: 'cylinder.bore',
				words: 'One cylinder',
				values: {
					bore: String(bore),
					stroke: String(stroke),
					ratio: ratio ? String(ratio) : '',
					rod: rod ? String(rod) : ''
				}
			}
		];
	}
});
