import { computed, type Outcome } from '$lib/kernel/outcome';
import { shimForLashMm } from '$lib/kernel/geometry/valve-lash';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import type { Sum } from './sum';

/** The shim that brings a measured lash to the wanted one. */
export const valveShimParameters = z.strictObject({ lash: sheetKeySchema });

type Parameters = z.infer<typeof valveShimParameters>;
type Inputs = { measured: number; wanted: number; shim: number };

export const valveShim: Sum<Parameters, Inputs> = {
	parameters: valveShimParameters,
	sheetKeys: ({ lash }) => [lash],
	draw({ lash }, random, sheet): Outcome<Inputs> {
		const figure = sheet.figure(lash);
		if (!figure.ok) return figure;
		const { least = 0, most = 0 } = figure.value;
		const wanted = shown((least + most) / 2, 2);
		const off = random.integer(3, 12) * (random.unit() < 0.5 ? -0.01 : 0.01);
		return computed({
			wanted,
			measured: shown(Math.max(0.02, wanted + off), 2),
			shim: shown(2.2 + random.integer(0, 40) / 100, 2)
		});
	},
	prompt: ({ wanted }) => `Which shim brings the lash to ${wanted.toFixed(2)} mm?`,
	given: ({ measured, shim }) => [
		{ words: 'Lash measured, cold', value: measured, unit: 'mm', decimals: 2 },
		{ words: 'Shim fitted now', value: shim, unit: 'mm', decimals: 2 }
	],
	expected({ measured, wanted, shim }) {
		const found = shimForLashMm(shim, measured, wanted);
		return found.ok ? computed({ value: found.value, unit: 'mm', decimals: 2 }) : found;
	},
	working({ measured, wanted, shim }) {
		const found = shimForLashMm(shim, measured, wanted);
		return [
			{
				words: 'What is too much lash must be filled by the shim',
				rule: 'N = T + (A − V)',
				formula: `${shim.toFixed(2)} + ${measured.toFixed(2)} − ${wanted.toFixed(2)}`,
				...(found.ok ? { value: shown(found.value, 2), unit: 'mm' } : {})
			}
		];
	}
};
