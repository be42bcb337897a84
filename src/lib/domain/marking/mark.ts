import { z } from 'zod';

/** The level given on one criterion, and why. */
export const markRowSchema = z.object({
	criterion: z.string(),
	level: z.coerce.number().int().min(0),
	words: z.string().trim().max(2000).default(''),
	/** For a row that needs one: the person who saw it at the bench. */
	witnessId: z.string().nullable().default(null)
});
export type MarkRow = z.infer<typeof markRowSchema>;
