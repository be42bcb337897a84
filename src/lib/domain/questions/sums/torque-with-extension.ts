import { torqueAtFastener, wrenchSetting } from '$lib/kernel/fasteners/extension';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { z } from 'zod';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import type { Sum } from './sum';

/** What to set on the wrench when an extension moves the socket; `ask: fastener` turns it round. */
export const torqueWithExtensionParameters = z.strictObject({
	/** A tightening of the data sheet, such as `head.tightening`; its first torque is used. */
	tightening: sheetKeySchema,
	angle: z.enum(['straight', 'any', 'across']).default('straight'),
	ask: z.enum(['wrench', 'fastener']).default('wrench')
});

type Parameters = z.infer<typeof torqueWithExtensionParameters>;
type Inputs = {
	ask: Parameters['ask'];
	words: string;
	torqueNm: number;
	lengthL: number;
	extensionE: number;
	angleDeg: number;
};

export const torqueWithExtension: Sum<Parameters, Inputs> = {
	parameters: torqueWithExtensionParameters,
	sheetKeys: ({ tightening }) => [tightening],
	draw({ tightening, angle, ask }, random, sheet): Outcome<Inputs> {
		const found = sheet.tightening(tightening);
		if (!found.ok) return found;
		const last = found.value.stages.filter((stage) => stage.kind === 'torque').at(-1);
		if (last?.kind !== 'torque') return cannot(`${found.value.words} has no torque stage`);
		const angleDeg = { straight: 0, across: 90, any: random.pick([15, 30, 45, 60, 120, 135]) }[
			angle
		];
		return computed({
			ask,
			words: found.value.words,
			torqueNm: last.torqueNm,
			lengthL: random.integer(14, 26) * 20,
			extensionE: random.integer(8, 24) * 5,
			angleDeg
		});
	},
	prompt: ({ ask }) =>
		ask === 'wrench'
			? 'What is set on the wrench, so that the fastener gets its torque?'
			: 'Somebody set the wrench to the printed torque and forgot the extension. What torque did the fastener get?',
	given: ({ words, torqueNm, lengthL, extensionE, angleDeg }) => [
		{ words: `${words}, printed torque`, value: torqueNm, unit: 'N·m', decimals: 0 },
		{ words: 'L, middle of the grip to the square', value: lengthL, unit: 'mm', decimals: 0 },
		{ words: 'E, square to the fastener', value: extensionE, unit: 'mm', decimals: 0 },
		{
			words: 'Angle of the extension to the wrench (0° straight on)',
			value: angleDeg,
			unit: '°',
			decimals: 0
		}
	],
	expected({ ask, torqueNm, ...lever }) {
		const found = (ask === 'wrench' ? wrenchSetting : torqueAtFastener)({
			torque: torqueNm,
			...lever
		});
		return found.ok ? computed({ value: found.value, unit: 'N·m', decimals: 1 }) : found;
	},
	working({ ask, torqueNm, lengthL, extensionE, angleDeg }) {
		const along = extensionE * Math.cos((angleDeg * Math.PI) / 180);
		const lever = { torque: torqueNm, lengthL, extensionE, angleDeg };
		const found = ask === 'wrench' ? wrenchSetting(lever) : torqueAtFastener(lever);
		return [
			{
				words: 'The part of the extension that lies along the wrench',
				formula: `${extensionE} × cos ${angleDeg}°`,
				value: shown(along, 1),
				unit: 'mm'
			},
			{
				words:
					ask === 'wrench'
						? 'Setting: torque times L over L plus that part'
						: 'At the fastener: setting times L plus that part, over L',
				formula:
					ask === 'wrench'
						? `${torqueNm} × ${lengthL} / (${lengthL} + ${along.toFixed(1)})`
						: `${torqueNm} × (${lengthL} + ${along.toFixed(1)}) / ${lengthL}`,
				...(found.ok ? { value: shown(found.value, 1), unit: 'N·m' } : {})
			}
		];
	}
};
