import { z } from 'zod';
import { expansionPerK, materials, type MaterialKey } from '$lib/kernel/geometry/expansion';
import { growthApartMm, growthOf, readingOfMm } from '$lib/kernel/geometry/temperature';
import { cannot, computed } from '$lib/kernel/outcome';
import { temperature } from '../../crib/calculators/temperature';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

const keys = materials.map((one) => one.key);

export const at20Parameters = z.strictObject({
	/** A size with limits to build. */
	of: sheetKeySchema,
	/** What the part is made of. */
	material: z.enum(keys as [MaterialKey, ...MaterialKey[]])
});

/**
 * A warm part under a cooler steel instrument: part 32 to 48 °C, instrument 18 to 22 °C, a size
 * around its printed limits. Drawn again until the correction is at least 0.003 mm, so that leaving
 * it out is never right.
 */
export const at20 = sumOf({
	calculator: temperature,
	parameters: at20Parameters,
	sheetKeys: ({ of }) => [of],
	draw({ of, material }, random, sheet) {
		const found = sheet.figure(of);
		if (!found.ok) return found;
		const { words, unit, least, most, decimals } = found.value;
		if (unit !== 'mm' || least === undefined || most === undefined || !(least > 1))
			return cannot(`${words} is no size with limits in the data sheet`);
		const [part, instrument] = [material, 'gauge-steel' as const];
		for (let tries = 0; tries < 60; tries++) {
			const [partC, instrumentC] = [random.integer(32, 48), random.integer(18, 22)];
			const size = random.between(least - (most - least), most + (most - least));
			const bodies = [
				{ expansionPerK: expansionPerK(part), temperatureC: partC },
				{ expansionPerK: expansionPerK(instrument), temperatureC: instrumentC }
			] as const;
			const read = readingOfMm(size, ...bodies);
			const correction = growthApartMm(size, growthOf(bodies[1]), growthOf(bodies[0]));
			if (!read.ok || !correction.ok || Math.abs(correction.value) < 0.003) continue;
			const reading = shown(read.value, decimals);
			const perK = (key: MaterialKey) => ({
				value: shown(expansionPerK(key) * 1e6, 1),
				unit: 'µm/(m·K)',
				decimals: 1
			});
			return computed({
				values: {
					reading,
					part,
					partC,
					instrument,
					instrumentC,
					ownPerK: undefined,
					within: undefined,
					least: undefined,
					most: undefined,
					uncertainty: undefined
				},
				ask: 'at-20',
				given: [
					{ words: `${words}, as read`, value: reading, unit: 'mm', decimals },
					{ words: 'Temperature of the part', value: partC, unit: '°C', decimals: 0 },
					{ words: 'Temperature of the instrument', value: instrumentC, unit: '°C', decimals: 0 },
					{ words: 'Expansion of the part', ...perK(part) },
					{ words: 'Expansion of the instrument', ...perK(instrument) }
				],
				prompt: 'The part is still warm. What does it measure at 20 °C, where sizes are printed?'
			});
		}
		return cannot(`${words} is too small for warmth to matter`);
	}
});
