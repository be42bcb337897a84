import { z } from 'zod';

export const slug = z
	.string()
	.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'small letters, digits and hyphens');
const words = z.string().trim().min(1);

export const stepKinds = ['lesson', 'quiz', 'job-sheet'] as const;

const step = z.strictObject({
	/** Unique in the course; stays when the course is revised. */
	key: slug,
	kind: z.enum(stepKinds),
	/** The key of the lesson, quiz or job sheet. */
	ref: slug,
	title: words.max(120)
});

/** What an award stands on. `rule` names a versioned rule in domain/certificates/rules. */
const award = z.strictObject({
	rule: z.string().min(1),
	benchHours: z.number().min(0).max(2000),
	/** What the course does not look at: printed on the certificate. */
	notAssessed: z.array(words).min(1)
});

export const courseSchema = z
	.strictObject({
		key: slug,
		title: words.max(120),
		summary: words.max(600),
		/** The data sheet that lessons, questions and job sheets take their values from. */
		engine: slug,
		/** `shownBy`: the steps of which any one, once competent, shows the outcome. */
		outcomes: z.array(z.strictObject({ key: slug, words, shownBy: z.array(slug).min(1) })).min(1),
		steps: z.array(step).min(1),
		award,
		priceMinor: z.number().int().min(0),
		hours: z.number().positive()
	})
	.superRefine((course, context) => {
		const keys = course.steps.map((one) => one.key);
		for (const key of keys)
			if (keys.indexOf(key) !== keys.lastIndexOf(key))
				context.addIssue({ code: 'custom', message: `the step ${key} stands twice` });
		for (const outcome of course.outcomes)
			for (const key of outcome.shownBy)
				if (!keys.includes(key))
					context.addIssue({ code: 'custom', message: `outcome ${outcome.key}: no step ${key}` });
	});

export type Course = z.infer<typeof courseSchema>;
export type Step = Course['steps'][number];
export type StepKind = Step['kind'];
