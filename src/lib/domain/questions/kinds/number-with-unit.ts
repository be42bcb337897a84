import { z } from 'zod';
import { wordsSchema } from '../words';
import { sumNames, sums } from '../sums/registry';

const positive = z.number().positive();

export const numberWithUnitBody = z
	.strictObject({
		/** Which sum; see `domain/questions/sums`. It draws the figures and has the kernel work it. */
		sum: z.enum(sumNames),
		/** The sum's own parameters: data-sheet keys and what is asked. */
		with: z.record(z.string(), z.unknown()),
		/** Leave out to use the sum's own words. */
		prompt: wordsSchema.optional(),
		/** In the sum's own unit, or as a fraction of the right value. */
		tolerance: z.union([
			z.strictObject({ absolute: positive }),
			z.strictObject({ relative: positive.max(0.2) })
		]),
		because: wordsSchema.optional()
	})
	.superRefine((body, context) => {
		const parsed = sums[body.sum].parameters.safeParse(body.with);
		if (!parsed.success)
			for (const issue of parsed.error.issues)
				context.addIssue({
					code: 'custom',
					path: ['with', ...issue.path],
					message: issue.message
				});
	});
export type NumberWithUnitBody = z.infer<typeof numberWithUnitBody>;
