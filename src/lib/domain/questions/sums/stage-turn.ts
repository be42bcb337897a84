import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** What the angle stages of a tightening come to: degrees in all, or how far the nut travels. */
export const stageTurnParameters = z.strictObject({
	tightening: sheetKeySchema,
	ask: z.enum(['degrees', 'travel']).default('degrees')
});
