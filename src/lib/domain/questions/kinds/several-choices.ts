import { z } from 'zod';
import { shortWordsSchema, wordsSchema } from '../words';

const option = z.strictObject({
	text: shortWordsSchema,
	right: z.boolean(),
	because: wordsSchema.optional()
});

export const severalChoicesBody = z.strictObject({
	prompt: wordsSchema,
	options: z
		.array(option)
		.min(3)
		.max(10)
		.refine((all) => all.some((one) => one.right), 'at least one option is right')
		.refine((all) => all.some((one) => !one.right), 'at least one option is wrong'),
	/** `shares`: each right choice earns a share, each wrong one costs a share. */
	scoring: z.enum(['shares', 'all-or-nothing']).default('shares'),
	because: wordsSchema
});
export type SeveralChoicesBody = z.infer<typeof severalChoicesBody>;
