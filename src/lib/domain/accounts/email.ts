import { z } from 'zod';

/** Addresses are compared in one spelling; the part before the @ is taken as case-blind too. */
export const emailAddress = z
	.string()
	.transform((text) => text.normalize('NFKC').trim().toLowerCase())
	.pipe(z.email('Give an e-mail address, such as name@school.example.').max(254));
