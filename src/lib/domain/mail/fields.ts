import { z } from 'zod';

/** What people typed goes into subjects: one line, and not a book. */
export const shortWords = z
	.string()
	.transform((text) => text.replace(/[\s\p{Cc}]+/gu, ' ').trim())
	.pipe(z.string().min(1).max(300));
/** A reason is quoted whole: as long as the longest that a form takes. */
export const reasonWords = z.string().trim().min(1).max(1000);
export const webAddress = z.url({ protocol: /^https?$/ });
export const count = z.int().min(0);
