import { z } from 'zod';

/** Text of a question. `{crankpin.diameter}` prints that value of the data sheet with its unit. */
export const wordsSchema = z.string().trim().min(1).max(2000);
export const shortWordsSchema = z.string().trim().min(1).max(400);

/** A dotted key of a data sheet, such as `crankpin.oilClearance`. */
export const sheetKeySchema = z
	.string()
	.regex(/^[a-z][A-Za-z0-9]*(\.[A-Za-z0-9][A-Za-z0-9-]*)*$/, 'a dotted data-sheet key');
