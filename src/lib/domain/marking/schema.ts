import { z } from 'zod';

const slug = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/);
const words = z.string().trim().min(1);

/** One row of a marking scheme: described levels, lowest first, and the least that is acceptable. */
const criterion = z
	.strictObject({
		key: slug,
		title: words.max(80),
		/** The outcome that it proves. */
		outcome: slug,
		levels: z.array(words.max(300)).min(2).max(6),
		/** Index into `levels`. */
		leastLevel: z.number().int().min(0),
		/** Below the least level here nothing else can make up for it. */
		mustPass: z.boolean().default(false),
		/** Marked only from what somebody saw at the bench, and who that was is named. */
		needsWitness: z.boolean().default(false),
		/** What to do again when the level is not reached. */
		redo: words.max(300)
	})
	.refine((one) => one.leastLevel < one.levels.length, 'the least level is one of the levels');

export const markingSchemeSchema = z.strictObject({
	criteria: z.array(criterion).min(1),
	/** How many rows that are no must-pass rows may lie one level below their least. */
	mayFallShort: z.number().int().min(0).default(0)
});

export type MarkingScheme = z.infer<typeof markingSchemeSchema>;
export type Criterion = MarkingScheme['criteria'][number];
