import { z } from 'zod';
import { computed } from '$lib/kernel/outcome';
import { rod } from '../../crib/calculators/rod';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const rodLineParameters = z.strictObject({
	ask: z.enum(['bend', 'twist']),
	/** Whether the big end's mandrel was read too, because the fixture does not hold it level. */
	bigEnd: z.boolean().default(false)
});

/**
 * Bend or twist of a rod from a dial over its mandrels, in 100 mm. Readings in hundredths: the
 * small end rises by 0.02 to 0.12 mm, the big end by up to 0.04 mm to the same side and always by
 * at least 0.01 mm less, over 80 to 160 mm. The dial was set down with 0.20 to 0.40 mm on it, so
 * that no reading is the answer.
 */
export const rodLine = sumOf({
	calculator: rod,
	parameters: rodLineParameters,
	sheetKeys: () => [],
	draw({ ask, bigEnd }, random) {
		const apart = random.pick([80, 120, 125, 150, 160]);
		const rise = random.integer(2, 12);
		const less = bigEnd ? random.integer(1, Math.min(4, rise - 1)) : 0;
		const farHigh = random.unit() < 0.5;
		const over = (steps: number, from: number) => {
			const [low, high] = [shown(from / 100, 2), shown((from + steps) / 100, 2)];
			return farHigh ? [low, high] : [high, low];
		};
		const small = over(rise, random.integer(20, 40));
		const big = bigEnd ? over(less, random.integer(20, 40)) : [null, null];
		const level = [0, 0];
		const none = [null, null];
		const mm = { unit: 'mm', decimals: 2 };
		const given = [
			{ end: 'Small', reads: small },
			{ end: 'Big', reads: big }
		].flatMap(({ end, reads }) =>
			reads.flatMap((value, at) =>
				value === null
					? []
					: [{ words: `${end} end’s mandrel, ${at === 0 ? 'near' : 'far'} side`, value, ...mm }]
			)
		);
		return computed({
			values: {
				readings: ask === 'bend' ? [small, big, level, none] : [level, none, small, big],
				apart,
				bigApart: undefined,
				bendMost: undefined,
				twistMost: undefined,
				uncertainty: undefined,
				over: undefined,
				bigMandrel: undefined,
				smallMandrel: undefined
			},
			ask,
			given: [
				...given,
				{ words: 'Distance between the two sides', value: apart, unit: 'mm', decimals: 0 }
			],
			prompt: `${ask === 'bend' ? 'The rod stands upright in its fixture' : 'The rod lies on its side'}, and a dial goes over ${bigEnd ? 'both mandrels' : 'the small end’s mandrel; the fixture holds the big end’s level'}. What is its ${ask} in 100 mm?`
		});
	}
});
