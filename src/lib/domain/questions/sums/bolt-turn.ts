import { z } from 'zod';
import { tabledAreaMm2 } from '$lib/kernel/fasteners/bolt-thread';
import { classStrength } from '$lib/kernel/fasteners/strength';
import { cannot, computed } from '$lib/kernel/outcome';
import { torqueAngle } from '../../crib/calculators/torque-angle';
import { isFigure } from '../../crib/worked';
import { sheetKeySchema } from '../words';
import { drawFactor, finalTorqueOf } from './draw-bolt';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const boltTurnParameters = z.strictObject({
	/** A tightening of a torque and angles, whose stretched length the sheet gives. */
	tightening: sheetKeySchema,
	/** The angle at which it yields, its pull after part of the turn, or how far all of it draws it. */
	ask: z.enum(['yield-angle', 'preload', 'lasting'])
});

/**
 * A bolt that is turned on after its snug torque: a nut factor within its lubrication, clamped
 * parts two to five times as stiff. Drawn again until yield begins between 20° and 300°, and, for
 * the lasting stretch, at least 10° before the stages end; a pull is asked for at half to nine
 * tenths of the angle at yield, to whole 5°.
 */
export const boltTurn = sumOf({
	calculator: torqueAngle,
	parameters: boltTurnParameters,
	sheetKeys: ({ tightening }) => [tightening],
	draw({ tightening, ask }, random, sheet) {
		const found = sheet.tightening(tightening);
		if (!found.ok) return found;
		const bolt = found.value;
		const { threadDiameterMm: d, threadPitchMm: p, propertyClass, gripMm, words } = bolt;
		const snug = finalTorqueOf(bolt);
		if (!snug.ok) return snug;
		const stages = bolt.stages.flatMap((one) => (one.kind === 'angle' ? [one.angleDeg] : []));
		if (gripMm === undefined || stages.length === 0)
			return cannot(`${words} has no angle or no stretched length in the data sheet`);
		const area = tabledAreaMm2({ diameterMm: d, pitchMm: p });
		if (!area.ok) return area;
		for (let tries = 0; tries < 60; tries++) {
			const factor = drawFactor(bolt, random);
			const joint = random.integer(2, 5);
			const part = random.between(0.5, 0.9);
			const values = {
				diameter: d,
				pitch: p,
				threads: undefined,
				propertyClass,
				grip: gripMm,
				shankLength: undefined,
				shankDiameter: undefined,
				clamped: 'times' as const,
				joint,
				face: undefined,
				snug: snug.value,
				leastFactor: factor,
				mostFactor: factor,
				angle: stages,
				threadFriction: undefined,
				hardening: undefined,
				wanted: undefined
			};
			const worked = torqueAngle.work(values);
			if (!worked.ok) return worked;
			const figure = (key: string) => {
				const line = worked.value.lines.find((one) => one.key === key);
				return line && isFigure(line) ? line.value : 0;
			};
			const yieldsAt = figure('yield-angle');
			if (yieldsAt < 20 || yieldsAt > 300) continue;
			if (ask === 'lasting' && figure('past') < 10) continue;
			const turned = Math.max(5, Math.round((part * yieldsAt) / 5) * 5);
			const angle = ask === 'preload' ? [turned] : stages;
			return computed({
				values: { ...values, angle },
				ask,
				given: [
					{ words: `${words}, snug torque`, value: snug.value, unit: 'N·m', decimals: 0 },
					...(ask === 'yield-angle'
						? []
						: angle.map((value, at) => ({
								words: angle.length > 1 ? `Angle after it, stage ${at + 1}` : 'Angle after it',
								value,
								unit: '°',
								decimals: 0
							}))),
					{ words: 'Nut factor', value: factor, unit: '', decimals: 2 },
					{ words: 'Nominal diameter', value: d, unit: 'mm', decimals: 0 },
					{ words: 'Pitch', value: p, unit: 'mm', decimals: 2 },
					{ words: 'Stress area', value: shown(area.value, 1), unit: 'mm²', decimals: 1 },
					{ words: 'Stretched length', value: gripMm, unit: 'mm', decimals: 0 },
					{
						words: 'Clamped parts, times as stiff as the bolt',
						value: joint,
						unit: '',
						decimals: 0
					},
					{
						words: `Yield strength of class ${propertyClass}`,
						value: classStrength(propertyClass, d).yieldMPa,
						unit: 'N/mm²',
						decimals: 0
					}
				],
				prompt: `${prompts[ask]} ${rule}`
			});
		}
		return cannot(`the stages of ${words} cannot be drawn for this question`);
	}
});

const rule =
	'Steel has 205 kN/mm², so the bolt’s stiffness is 205 · As / L; parts that are n times as stiff leave n / (n + 1) of it for both together.';
const prompts: Record<z.infer<typeof boltTurnParameters>['ask'], string> = {
	'yield-angle': 'After which angle from the snug torque does this bolt begin to yield?',
	preload: 'How hard does this bolt pull after the angle that is given?',
	lasting: 'By how much is this bolt drawn for good, when its load stays level past yield?'
};
