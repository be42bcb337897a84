import { ringGapGrowthMm, ringGapInMm } from '$lib/kernel/geometry/end-play';
import { computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { shown, worked } from './draw-reading';
import type { Sum } from './sum';

/** How much wider a ring's gap stands in a worn bore: pi times the growth of the bore. */
export const ringGapParameters = z.strictObject({ bore: sheetKeySchema, gap: sheetKeySchema });

type Parameters = z.infer<typeof ringGapParameters>;
type Inputs = { boreGrowth: number; gap: number; decimals: number };

export const ringGap: Sum<Parameters, Inputs> = {
	parameters: ringGapParameters,
	sheetKeys: ({ bore, gap }) => [bore, gap],
	draw({ bore, gap }, random, sheet): Outcome<Inputs> {
		const cylinder = sheet.figure(bore);
		if (!cylinder.ok) return cylinder;
		const ring = sheet.figure(gap);
		if (!ring.ok) return ring;
		const { least = 0, most = 0, decimals } = ring.value;
		const boreGrowth = shown(random.between(0.03, 0.12), 2);
		return computed({ boreGrowth, gap: shown(random.between(least, most), decimals), decimals });
	},
	prompt: () =>
		'The ring is put into the worn part of the bore. How wide does its end gap stand there?',
	given: ({ boreGrowth, gap, decimals }) => [
		{ words: 'End gap in the unworn part of the bore', value: gap, unit: 'mm', decimals },
		{ words: 'The bore is larger there by', value: boreGrowth, unit: 'mm', decimals: 2 }
	],
	expected({ boreGrowth, gap }) {
		const there = ringGapInMm(gap, boreGrowth);
		return there.ok ? computed({ value: there.value, unit: 'mm', decimals: 2 }) : there;
	},
	working({ boreGrowth, gap, decimals }) {
		const growth = worked(ringGapGrowthMm(boreGrowth), 3);
		return [
			{
				words: 'The circumference grows by π times the diameter’s growth',
				rule: 'Δg = π · ΔD',
				formula: `π × ${boreGrowth.toFixed(2)}`,
				...growth,
				unit: 'mm'
			},
			{
				words: 'Gap there',
				rule: 'g = g0 + Δg',
				formula: `${gap.toFixed(decimals)} + ${growth.value?.toFixed(3)}`,
				...worked(ringGapInMm(gap, boreGrowth), 2),
				unit: 'mm'
			}
		];
	}
};
