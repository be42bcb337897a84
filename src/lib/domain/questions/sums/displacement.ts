import { displacementCm3 } from '$lib/kernel/cylinder/displacement';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import type { Sum } from './sum';

/** Swept volume of one cylinder, or of all of them, from bore and stroke. */
export const displacementParameters = z.strictObject({
	bore: sheetKeySchema,
	stroke: sheetKeySchema,
	cylinders: z.number().int().min(1).max(16)
});

type Parameters = z.infer<typeof displacementParameters>;
type Inputs = { boreMm: number; strokeMm: number; cylinders: number };

export const displacement: Sum<Parameters, Inputs> = {
	parameters: displacementParameters,
	sheetKeys: ({ bore, stroke }) => [bore, stroke],
	draw({ bore, stroke, cylinders }, random, sheet): Outcome<Inputs> {
		const [b, s] = [sheet.figure(bore), sheet.figure(stroke)];
		if (!b.ok) return b;
		if (!s.ok) return s;
		if (b.value.nominal === undefined || s.value.nominal === undefined)
			return cannot('the sheet states no nominal size');
		// An oversize of the trade, so that the figure is this student's own.
		return computed({
			boreMm: b.value.nominal + random.pick([0, 0.25, 0.5, 1]),
			strokeMm: s.value.nominal,
			cylinders
		});
	},
	prompt: ({ cylinders }) =>
		`What is the swept volume of ${cylinders === 1 ? 'one cylinder' : `all ${cylinders} cylinders`}?`,
	given: ({ boreMm, strokeMm }) => [
		{ words: 'Bore, after machining', value: boreMm, unit: 'mm', decimals: 2 },
		{ words: 'Stroke', value: strokeMm, unit: 'mm', decimals: 1 }
	],
	expected: ({ boreMm, strokeMm, cylinders }) =>
		computed({ value: displacementCm3(boreMm, strokeMm, cylinders), unit: 'cm³', decimals: 1 }),
	working: ({ boreMm, strokeMm, cylinders }) => [
		{
			words: 'π/4 times bore squared times stroke, in cm',
			formula: `${cylinders} × π/4 × ${(boreMm / 10).toFixed(3)}² × ${(strokeMm / 10).toFixed(2)}`,
			value: shown(displacementCm3(boreMm, strokeMm, cylinders), 1),
			unit: 'cm³'
		}
	]
};
