import { leftToTurnDeg, turnedDeg } from '$lib/kernel/fasteners/stage-sequence';
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

const stagesOf = (angles: readonly number[]) => angles.map((angleDeg) => ({ angleDeg }));

export const stageTurn: Sum<Parameters, Inputs> = {
	parameters: stageTurnParameters,
	sheetKeys: ({ tightening }) => [tightening],
	draw({ tightening, ask }, random, sheet): Outcome<Inputs> {
		const found = sheet.tightening(tightening);
		if (!found.ok) return found;
		const angles = found.value.stages.flatMap((stage) =>
			stage.kind === 'angle' ? [stage.angleDeg] : []
		);
		if (angles.length === 0) return cannot(`${found.value.words} has no angle stage`);
		const all = turnedDeg(stagesOf(angles));
		if (all < 30) return cannot(`${found.value.words} turns too little to ask about`);
		// Part of the turn is done: how much is left is this student's own figure.
		const turned =
			ask === 'degrees'
				? random.integer(1, Math.floor(all / 15) - 1) * 15
				: random.integer(2, Math.floor(all / 15)) * 15;
		return computed({
			ask,
			words: found.value.words,
			angles,
			turned,
			pitchMm: found.value.threadPitchMm
		});
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
	expected({ ask, angles, turned, pitchMm }) {
		if (ask === 'travel')
			return computed({ value: travelMm(turned, pitchMm), unit: 'mm', decimals: 3 });
		const left = leftToTurnDeg(stagesOf(angles), turned);
		return left.ok ? computed({ value: left.value, unit: '°', decimals: 0 }) : left;
	},
	working({ ask, angles, turned, pitchMm }) {
		if (ask === 'travel')
			return [
				{
					words: 'Pitch times the share of a full turn',
					rule: 's = P · α / 360°',
					formula: `${pitchMm} · ${turned} / 360`,
					value: shown(travelMm(turned, pitchMm), 3),
					unit: 'mm'
				}
			];
		const stages = stagesOf(angles);
		const left = leftToTurnDeg(stages, turned);
		return [
			{
				words: 'All angle stages of the data sheet',
				formula: angles.join(' + '),
				value: turnedDeg(stages),
				unit: '°'
			},
			{
				words: 'Less what is turned',
				rule: 'left = Σ angle stages − turned',
				formula: `${turnedDeg(stages)} − ${turned}`,
				...(left.ok ? { value: left.value } : {}),
				unit: '°'
			}
		];
	}
};
