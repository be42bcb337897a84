import { z } from 'zod';

/** `crankpin.oilClearance`: a part family, then what is meant of it. */
export const sheetKey = z
	.string()
	.regex(/^[a-z][A-Za-z0-9]*(\.[a-z][A-Za-z0-9]*)+$/, 'a key such as crankpin.oilClearance');
export const familyKey = z.string().regex(/^[a-z][A-Za-z0-9]*$/, 'a key such as crankpin');
export const words = z
	.string()
	.trim()
	.min(1, 'Say it in words.')
	.max(200, 'At most 200 characters.');
export const longWords = z
	.string()
	.trim()
	.min(1, 'Say it in words.')
	.max(600, 'At most 600 characters.');

/** Each value says where it comes from: which manual or measurement, and the page in it. */
export const sourced = { source: words, page: z.string().trim().max(40).optional() };
