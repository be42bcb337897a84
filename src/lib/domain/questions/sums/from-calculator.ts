import type { z } from 'zod';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Random } from '$lib/kernel/random/random';
import type { Calculator } from '../../crib/calculator';
import type { Fields, ValuesOf } from '../../crib/field';
import { isFigure } from '../../crib/worked';
import type { SheetFigures } from '../sheet-figures';
import type { Given, Sum } from './sum';

/** What a drawn question types into the calculator, and what it asks of the result. */
export type DrawnFigures<F extends Fields> = {
	values: ValuesOf<F>;
	/** The key of the result line that is asked for. */
	ask: string;
	given: Given[];
	prompt: string;
};

/**
 * A question that is a calculator with drawn figures: its key and its working are the
 * calculator's own result and steps, so that the two can never disagree.
 */
export function sumOf<P, F extends Fields>(given: {
	calculator: Calculator<F>;
	parameters: z.ZodType<P>;
	sheetKeys: (parameters: P) => string[];
	/** Figures as a bench could give them; says "cannot" where the sheet lacks what it needs. */
	draw: (parameters: P, random: Random, sheet: SheetFigures) => Outcome<DrawnFigures<F>>;
}): Sum<P, DrawnFigures<F>> {
	const { calculator, parameters, sheetKeys, draw } = given;
	return {
		parameters,
		sheetKeys,
		draw: (asked, random, sheet) => draw(asked, random, sheet),
		prompt: ({ prompt }) => prompt,
		given: (drawn) => drawn.given,
		expected({ values, ask }) {
			const worked = calculator.work(values);
			if (!worked.ok) return worked;
			const line = worked.value.lines.find((one) => one.key === ask);
			if (!line || !isFigure(line)) return cannot(`${calculator.title} gives no figure ${ask}`);
			return computed({ value: line.value, unit: line.unit, decimals: line.decimals });
		},
		working({ values }) {
			const worked = calculator.work(values);
			return worked.ok ? worked.value.working : [];
		}
	};
}
