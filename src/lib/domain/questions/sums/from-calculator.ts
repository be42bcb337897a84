import type { z } from 'zod';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Random } from '$lib/kernel/random/random';
import type { Calculator } from '../../crib/calculator';
import type { Fields, ValuesOf } from '../../crib/field';
import { isFigure, type FigureLine } from '../../crib/worked';
import type { Step } from '../../working';
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
		expected(drawn) {
			const found = askedOf(calculator, drawn);
			if (!found.ok) return found;
			const { value, unit, decimals } = found.value.line;
			return computed({ value, unit, decimals });
		},
		working(drawn) {
			const found = askedOf(calculator, drawn);
			if (!found.ok) return [];
			const { line, working } = found.value;
			// What the calculator goes on to say after this is another question's.
			const at = working.findLastIndex(
				({ value, unit }) => unit === line.unit && value === line.value
			);
			return at < 0 ? working : working.slice(0, at + 1);
		}
	};
}

function askedOf<F extends Fields>(
	calculator: Calculator<F>,
	{ values, ask }: DrawnFigures<F>
): Outcome<{ line: FigureLine; working: Step[] }> {
	const worked = calculator.work(values);
	if (!worked.ok) return worked;
	const { lines, working } = worked.value;
	const line = lines.find((one) => one.key === ask);
	return line && isFigure(line)
		? computed({ line, working })
		: cannot(`${calculator.title} gives no figure ${ask}`);
}
