import { z } from 'zod';
import { standardPitchesMm } from '$lib/kernel/fasteners/standard-pitches';
import { classStrength } from '$lib/kernel/fasteners/strength';
import { computed } from '$lib/kernel/outcome';
import { thread as calculator } from '../../crib/calculators/thread';
import { sumOf } from './from-calculator';

export const boltLoadParameters = z.strictObject({
	ask: z.enum(['area', 'proof', 'yield', 'tensile'])
});

const stresses = {
	proof: { words: 'Proof stress', part: 'proofMPa' },
	yield: { words: 'Yield strength', part: 'yieldMPa' },
	tensile: { words: 'Least tensile strength', part: 'tensileMPa' }
} as const;

/**
 * Stress area, proof, yield or tensile load of a bolt as they lie in a drawer: M6 to M16 in a pitch
 * of the series, class 5.8 to 12.9. The area follows from the rule that the prompt states.
 */
export const boltLoad = sumOf({
	calculator,
	parameters: boltLoadParameters,
	sheetKeys: () => [],
	draw({ ask }, random) {
		const diameter = random.pick([6, 8, 10, 12, 14, 16]);
		const pitch = random.pick(standardPitchesMm(diameter));
		const propertyClass = random.pick(['5.8', '8.8', '10.9', '12.9'] as const);
		const strength = classStrength(propertyClass, diameter);
		return computed({
			values: { diameter, pitch, threads: undefined, propertyClass, socket: undefined },
			ask,
			given: [
				{ words: 'Nominal diameter d', value: diameter, unit: 'mm', decimals: 0 },
				{ words: 'Pitch P', value: pitch, unit: 'mm', decimals: 2 },
				...(ask === 'area'
					? []
					: [
							{
								words: `${stresses[ask].words} of class ${propertyClass}`,
								value: strength[stresses[ask].part],
								unit: 'N/mm²',
								decimals: 0
							}
						])
			],
			prompt: `${prompts[ask]} Its stress area is π/4 · (d − 0.9382 P)².`
		});
	}
});

const prompts: Record<z.infer<typeof boltLoadParameters>['ask'], string> = {
	area: 'What is the stress area of this bolt?',
	proof: 'What is the proof load of this bolt, which it bears and still springs back from?',
	yield: 'At which load does this bolt begin to yield?',
	tensile: 'Which load does this bolt bear at least before it parts?'
};
