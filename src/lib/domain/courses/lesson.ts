import { z } from 'zod';

const slug = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'small letters, digits and hyphens');
const words = z.string().trim().min(1).max(200);

/** The front matter of a lesson's text. */
export const lessonMetadataSchema = z.object({
	title: words,
	drawnBy: words,
	/** The data sheet that its values come from. */
	engine: slug,
	/** Where there is a film beside the text. */
	film: z.object({ title: words, durationS: z.number().positive() }).optional(),
	/** One line for lists. */
	summary: words
});
export type LessonMetadata = z.infer<typeof lessonMetadataSchema>;

/** A line that is said in a film, and when. */
export type Cue = { startS: number; endS: number; text: string };
