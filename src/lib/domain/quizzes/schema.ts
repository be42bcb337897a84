import { z } from 'zod';
import { kindNames } from '../questions/kind-names';

const slug = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'small letters, digits and hyphens');

const fixed = z.strictObject({ question: slug });
const drawn = z
	.strictObject({
		draw: z.number().int().min(1).max(50),
		outcome: slug.optional(),
		kind: z.enum(kindNames).optional()
	})
	.refine((line) => line.outcome ?? line.kind, 'a line to draw names an outcome, a kind or both');

export const quizSchema = z.strictObject({
	key: slug,
	title: z.string().trim().min(1).max(120),
	/** What it is about and what to have at hand, before the clock runs. */
	intro: z.string().trim().min(1).max(1000),
	/** Which questions: named ones, and how many to draw by outcome or kind. */
	plan: z.array(z.union([fixed, drawn])).min(1),
	/** The share of the points that passes. */
	cutScore: z.number().gt(0).max(1),
	/** Null: no clock. */
	timeLimitMinutes: z.number().int().min(1).max(480).nullable(),
	attempts: z.number().int().min(1).max(20),
	/** Between handing in a failed sitting and beginning the next. */
	waitHours: z.number().min(0).max(720).default(0),
	/** In words: "data sheet, calculator, your own notes". Empty: none. */
	permittedAids: z.array(z.string().trim().min(1).max(120)).default([]),
	order: z.enum(['shuffled', 'as-planned']).default('shuffled')
});
export type Quiz = z.infer<typeof quizSchema>;
export type QuizLine = Quiz['plan'][number];

/** How many questions a sitting has: printed before it is begun. */
export function questionCount(quiz: Pick<Quiz, 'plan'>): number {
	return quiz.plan.reduce((sum, line) => sum + ('draw' in line ? line.draw : 1), 0);
}
