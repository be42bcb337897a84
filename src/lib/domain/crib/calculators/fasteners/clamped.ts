import {
	jointOfConesNPerMm,
	partModulusMPa,
	timesAsStiffNPerMm,
	type PartMaterial
} from '$lib/kernel/fasteners/joint-stiffness';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Step } from '../../../working';
import { choice, number, quantity } from '../../field';
import { plain } from '../formula-figures';
import { length } from './bolt-fields';

/** How the stiffness of what is clamped is known. */
export const clampedFields = {
	clamped: choice({
		words: 'Stiffness of the clamped parts',
		options: [
			{ value: 'times', words: 'Times that of the bolt' },
			{ value: 'steel', words: 'Two cones in steel' },
			{ value: 'iron', words: 'Two cones in cast iron' },
			{ value: 'aluminium', words: 'Two cones in aluminium' },
			{ value: 'known', words: 'Known in kN/mm' }
		],
		example: 'times'
	}),
	joint: number({
		words: 'Times as stiff as the bolt, or kN/mm',
		hint: 'Two to five times is met in heads and caps; common practice. Not wanted for cones.',
		least: 0.01,
		most: 100_000,
		optional: true,
		example: '3'
	}),
	face: quantity({
		...length,
		words: 'Face under the head, for cones',
		hint: 'Diameter that presses on the part.',
		decimals: 1,
		least: 1,
		most: 400,
		optional: true,
		example: ''
	})
};

type TypedParts = {
	clamped: 'times' | 'known' | PartMaterial;
	joint: number | undefined;
	face: number | undefined;
};
export type Clamped = { stiffnessNPerMm: number; step: Step };

/** Stiffness of the clamped parts, in whichever way it is known. */
export function clampedOf(
	{ clamped, joint, face }: TypedParts,
	boltNPerMm: number,
	diameterMm: number,
	gripMm: number
): Outcome<Clamped> {
	const knPerMm = { unit: 'kN/mm', decimals: 1 };
	if (clamped === 'times' || clamped === 'known') {
		if (joint === undefined)
			return cannot(
				clamped === 'times'
					? 'fill in how many times as stiff as the bolt the parts are'
					: 'fill in the stiffness of the parts in kN/mm'
			);
		const stiffness =
			clamped === 'times' ? timesAsStiffNPerMm(joint, boltNPerMm) : computed(joint * 1000);
		if (!stiffness.ok) return stiffness;
		return computed({
			stiffnessNPerMm: stiffness.value,
			step: {
				words: 'Stiffness of the clamped parts',
				...(clamped === 'times'
					? { rule: 'kj = n · kb', formula: `${plain(joint)} · ${(boltNPerMm / 1000).toFixed(1)}` }
					: {}),
				value: stiffness.value / 1000,
				...knPerMm
			}
		});
	}
	if (face === undefined) return cannot('fill in the face under the head that presses on the part');
	const modulusMPa = partModulusMPa[clamped];
	const stiffness = jointOfConesNPerMm(face, diameterMm, gripMm, modulusMPa);
	if (!stiffness.ok) return stiffness;
	const [d, D] = [plain(diameterMm), plain(face)];
	const spread = `1.155 · ${plain(gripMm / 2)}`;
	return computed({
		stiffnessNPerMm: stiffness.value,
		step: {
			words: 'Stiffness of the clamped parts, a cone from each face to the middle',
			rule: 'kj = 0.5774 π · E · d / (2 · ln((1.155 t + D − d)(D + d) / ((1.155 t + D + d)(D − d)))), t = L/2',
			formula: `0.5774 π · ${modulusMPa / 1000} · ${d} / (2 · ln((${spread} + ${D} − ${d}) · (${D} + ${d}) / ((${spread} + ${D} + ${d}) · (${D} − ${d}))))`,
			value: stiffness.value / 1000,
			...knPerMm
		}
	});
}
