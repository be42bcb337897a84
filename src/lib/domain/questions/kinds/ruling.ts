import { z } from 'zod';
import { sheetKeySchema, shortWordsSchema, wordsSchema } from '../words';

export const rulingBody = z.strictObject({
	prompt: wordsSchema.optional(),
	/** A value of the data sheet that has limits. */
	about: sheetKeySchema,
	/** To build: the printed limits. To run again: the wear limit. */
	purpose: z.enum(['build', 'run-again']),
	instrument: z.strictObject({
		name: shortWordsSchema,
		/** Expanded uncertainty, k = 2, in the value's own unit. */
		uncertainty: z.number().positive()
	}),
	/** Leave out to let the seed choose. */
	aim: z.enum(['within', 'out', 'too-close']).optional(),
	because: wordsSchema.optional()
});
export type RulingBody = z.infer<typeof rulingBody>;
