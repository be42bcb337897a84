import { travelMm } from '$lib/kernel/fasteners/turn';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import type { Sum } from './sum';

/** What the angle stages of a tightening come to: degrees in all, or how far the nut travels. */
export const stageTurnParameters = z.strictObject({
	tightening: sheetKeySchema,
	ask: z.enum(['degrees', 'travel']).default('degrees')
});

type Parameters = z.infer<typeof stageTurnParameters>;
type Inputs = {
	ask: Parameters['ask'];
	words: string;
	angles: number[];
	turned: number;
	pitchMm: number;
};

export const stageTurn: Sum<Parameters, Inputs> = {
	parameters: stageTurnParameters,
	sheetKeys: ({ tightening }) => [tightening],
	draw({ tightening, ask }, random, sheet): Outcome<Inputs> {
		const found = sheet.tightening(tightening);
		if (!found.ok) return found;
		const angles = found.value.stages.flatMap((stage) =>
			stage.kind === 'angle' ? [stage.angleDeg] : []
		);
		const pitchMm = found.value.threadPitchMm;
		if (angles.length === 0 || pitchMm === undefined)
			return cannot(`${found.value.words} has no angle stage`);
		const all = angles.reduce((sum, one) => sum + one, 0);
		if (all < 30) return cannot(`${found.value.words} turns too little to ask about`);
		// Part of the turn is done: how much is left is this student's own figure.
		const turned =
			ask === 'degrees'
				? random.integer(1, Math.floor(all / 15) - 1) * 15
				: random.integer(2, Math.floor(all / 15)) * 15;
		return computed({ ask, words: found.value.words, angles, turned, pitchMm });
	},
	prompt: ({ ask }) =>
		ask === 'degrees'
			? 'The torque stage is done and the bolt has been turned as given. How many degrees are still to be turned through all angle stages?'
			: 'How far does the bolt travel along its thread by the turn that is given?',
	given: ({ ask, words, turned, pitchMm }) => [
		{ words: `${words}, turned`, value: turned, unit: '°', decimals: 0 },
		...(ask === 'travel'
			? [{ words: 'Pitch of the thread', value: pitchMm, unit: 'mm', decimals: 2 }]
			: [])
	],
	expected: ({ ask, angles, turned, pitchMm }) =>
		ask === 'degrees'
			? computed({
					value: angles.reduce((sum, one) => sum + one, 0) - turned,
					unit: '°',
					decimals: 0
				})
			: computed({ value: travelMm(turned, pitchMm), unit: 'mm', decimals: 3 }),
	working: ({ ask, angles, turned, pitchMm }) =>
		ask === 'degrees'
			? [
					{
						words: 'All angle stages of the data sheet',
						formula: angles.join(' + '),
						value: angles.reduce((sum, one) => sum + one, 0),
						unit: '°'
					},
					{
						words: 'Less what is turned',
						value: angles.reduce((sum, one) => sum + one, 0) - turned,
						unit: '°'
					}
				]
			: [
					{
						words: 'Pitch times the share of a full turn',
						formula: `${pitchMm} × ${turned}/360`,
						value: shown(travelMm(turned, pitchMm), 3),
						unit: 'mm'
					}
				]
};
