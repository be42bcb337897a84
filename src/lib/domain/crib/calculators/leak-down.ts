import { leakBand, leakPercent, whereAirComesOut } from '$lib/kernel/cylinder/leak-down';
import { cannot, computed } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { quantity, table } from '../field';
import type { ResultLine } from '../worked';
import { figure } from './formula-figures';

const pressure = { dimension: 'pressure', unit: { metric: 'bar', inch: 'psi' } } as const;

/** Leakage of each cylinder under air at top dead centre. */
export const leakDown = calculator({
	key: 'leak-down',
	title: 'Leak-down test',
	says: 'How much each cylinder leaks under air at top dead centre, what the trade calls it, and where to listen.',
	drawer: 'cylinder',
	caution:
		'Off top dead centre the test air can spin the crankshaft suddenly: keep hands, tools and bars clear. A maker’s own limits win.',
	formulas: ['cylinder/leak', 'cylinder/leak-band'],
	sources: whereAirComesOut.map((one) => `Air at ${one.at}: ${one.says}.`),
	fields: {
		input: quantity({
			...pressure,
			words: 'Regulator’s gauge',
			decimals: 2,
			least: 0.1,
			most: 20,
			example: '5.5'
		}),
		held: table({
			...pressure,
			words: 'Cylinder’s gauge',
			row: 'Cylinder',
			columns: [{ key: 'held', words: 'Held', of: 'quantity' }],
			rows: { from: 4, least: 1, most: 16 },
			example: '5.1*4.9*3.9*5.0'
		})
	},
	work({ input, held }) {
		const lines: ResultLine[] = [];
		const working: Step[] = [];
		const bars: { words: string; value: number; low: boolean }[] = [];
		for (const [at, row] of held.entries()) {
			const leak = leakPercent(input, Number(row.held));
			if (!leak.ok) return cannot(`cylinder ${at + 1}: ${leak.because}`);
			const band = leakBand(leak.value);
			if (!band.ok) return band;
			bars.push({ words: String(at + 1), value: leak.value, low: band.value.suspect });
			lines.push({
				key: `leak-${at}`,
				words: `Cylinder ${at + 1}: ${band.value.words}${band.value.suspect ? ', suspect' : ''}`,
				value: leak.value,
				unit: '%',
				decimals: 1,
				main: true
			});
			working.push({
				words: `Cylinder ${at + 1}`,
				rule: 'leak = 100 % · (p − c) / p',
				formula: `100 · (${figure(input, 2)} − ${figure(Number(row.held), 2)}) / ${figure(input, 2)}`,
				value: leak.value,
				unit: '%',
				decimals: 1
			});
		}
		return computed({
			lines,
			working,
			notes: [
				'Listen: exhaust, exhaust valve; inlet, inlet valve; breather, rings, piston or bore; bubbles in the coolant, gasket or crack; next plug hole, gasket between the two.'
			],
			drawing: { kind: 'cylinder-bars', unit: '%', bars, line: 25, lineWords: 'suspect above' }
		});
	}
});
