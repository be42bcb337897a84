import { z } from 'zod';
import { cannot, computed } from '$lib/kernel/outcome';
import { deckHeight } from '../../crib/calculators/deck-height';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const protrusionParameters = z.strictObject({
	/** Height of the crowns above the deck, with two limits to build. */
	of: sheetKeySchema
});

/**
 * Three pistons read at both ends of their pins, in hundredths; the height of the highest is asked.
 * It lies from 0.03 mm below the printed limits to 0.06 above; the second stands 0.01 to 0.03 mm
 * lower but rocks more, so that the largest single reading is its own; the third 0.03 to 0.07 lower.
 * No reading is the height that is asked for.
 */
export const protrusion = sumOf({
	calculator: deckHeight,
	parameters: protrusionParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of }, random, sheet) {
		const found = sheet.figure(of);
		if (!found.ok) return found;
		const { words, least, most } = found.value;
		if (least === undefined || most === undefined)
			return cannot(`${words} has no two limits in the data sheet`);
		const highest = Math.round(100 * random.between(least - 0.03, most + 0.06));
		const rock = random.integer(1, 2);
		const lower = random.integer(1, 3);
		const crowns: [middle: number, rock: number][] = [
			[highest, rock],
			[highest - lower, lower + rock + random.integer(1, 2)],
			[highest - random.integer(3, 7), random.integer(1, 2)]
		];
		const pistons = random.shuffle(crowns).map(([middle, rocks]) => {
			const [first = 0, second = 0] = random.shuffle([middle - rocks, middle + rocks]);
			return { first: shown(first / 100, 2), second: shown(second / 100, 2) };
		});
		const mm = { unit: 'mm', decimals: 2 };
		return computed({
			values: {
				pistons,
				classes: undefined,
				least: undefined,
				most: undefined,
				uncertainty: undefined
			},
			ask: 'highest',
			given: pistons.flatMap(({ first, second }, at) => [
				{ words: `Piston ${at + 1}, one end of the pin`, value: first, ...mm },
				{ words: `Piston ${at + 1}, the other end`, value: second, ...mm }
			]),
			prompt:
				'The dial stood at zero on the deck. Each piston was read at both ends of its pin. How high stands the highest piston?'
		});
	}
});
