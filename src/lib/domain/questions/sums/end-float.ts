import { z } from 'zod';
import { cannot, computed } from '$lib/kernel/outcome';
import { endFloat as endFloatPage } from '../../crib/calculators/end-float';
import { sheetKeySchema } from '../words';
import { shown } from './draw-reading';
import { sumOf } from './from-calculator';

export const endFloatParameters = z.strictObject({
	/** A float with limits to build and a wear limit. */
	of: sheetKeySchema
});

/**
 * A dial at the end of a shaft, pushed one way and the other. The float lies between 0.05 mm and a
 * tenth beyond its wear limit; the dial was set down with 0.1 to 0.6 mm more travel on it
 * than that, so that neither reading is the answer.
 */
export const endFloat = sumOf({
	calculator: endFloatPage,
	parameters: endFloatParameters,
	sheetKeys: ({ of }) => [of],
	draw({ of }, random, sheet) {
		const found = sheet.figure(of);
		if (!found.ok) return found;
		const { words, most, wearLimit = most } = found.value;
		if (wearLimit === undefined) return cannot(`${words} has no limit in the data sheet`);
		const float = shown(random.between(Math.min(0.05, wearLimit / 2), 1.1 * wearLimit), 2);
		const towards = shown(float + random.between(0.1, 0.6), 2);
		const away = shown(towards + float, 2);
		const mm = { unit: 'mm', decimals: 2 };
		return computed({
			values: {
				towards,
				away,
				buildLeast: undefined,
				buildMost: undefined,
				runMost: undefined,
				uncertainty: undefined
			},
			ask: 'float',
			given: [
				{ words: 'Dial, pushed one way', value: towards, ...mm },
				{ words: 'Dial, pushed the other way', value: away, ...mm }
			],
			prompt: `“${words}” was read with a dial on its end. How large is it?`
		});
	}
});
