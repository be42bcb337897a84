import { z } from 'zod';
import { shortWordsSchema, wordsSchema } from '../words';

const option = z.strictObject({
	text: shortWordsSchema,
	right: z.literal(true).optional(),
	/** Shown after the response to whoever chose it: why it is not so. */
	because: wordsSchema.optional()
});

export const singleChoiceBody = z.strictObject({
	prompt: wordsSchema,
	options: z
		.array(option)
		.min(3)
		.max(8)
		.refine((all) => all.filter((one) => one.right).length === 1, 'exactly one option is right'),
	/** Why the right one is right. */
	because: wordsSchema
});
export type SingleChoiceBody = z.infer<typeof singleChoiceBody>;
