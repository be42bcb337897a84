import { z } from 'zod';
import { sheetKeySchema, wordsSchema } from '../words';

export const tighteningOrderBody = z.strictObject({
	prompt: wordsSchema.optional(),
	/** The data sheet's bolt pattern, such as `head.bolts`. */
	pattern: sheetKeySchema,
	direction: z.enum(['tighten', 'loosen']),
	because: wordsSchema
});
export type TighteningOrderBody = z.infer<typeof tighteningOrderBody>;
