import { z } from 'zod';
import { stepStates } from '../courses/step-state';

const day = z.iso.date();
const line = z.string().trim().min(1).max(400);

/** With whose hands a task was done. Being helped is no shame and is said. */
export const hows = ['alone', 'pair', 'helped'] as const;
export type How = (typeof hows)[number];

export const taskSchema = z.strictObject({
	stepKey: z.string(),
	title: line,
	/** Which engine it was, for instance "AV3-1150, stand 4". */
	engine: line,
	how: z.enum(hows),
	/** What this person did of it, where it was not done alone. */
	share: line.nullable(),
	attempt: z.int().min(1),
	decision: z.enum(['competent', 'not-yet']),
	decidedOn: day
});

/**
 * All that an award is decided from, gathered once and kept with the award. A rule sees this and
 * nothing else, so that the same evidence gives the same answer later.
 */
export const evidenceSchema = z.strictObject({
	steps: z.array(
		z.strictObject({
			key: z.string(),
			title: line,
			kind: z.enum(['lesson', 'quiz', 'job-sheet', 'case']),
			state: z.enum(stepStates),
			/** A step for those who want more does not hold an award up. */
			needed: z.boolean()
		})
	),
	/** The best sitting of each quiz, with the words of its own pass rule. */
	quizzes: z.array(
		z.strictObject({ stepKey: z.string(), title: line, passed: z.boolean(), words: line })
	),
	/** The newest decided attempt of each job sheet. */
	tasks: z.array(taskSchema),
	bench: z.strictObject({ minutes: z.int().min(0), neededMinutes: z.int().min(0) }),
	outcomes: z.array(z.strictObject({ words: line, shownBySteps: z.array(z.string()) })),
	/** What the course leaves out, in the course's own words. */
	notAssessed: z.array(line)
});

export type Task = z.infer<typeof taskSchema>;
export type Evidence = z.infer<typeof evidenceSchema>;
