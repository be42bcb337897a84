import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** Bore minus what runs in it, one reading of each: a piston at the stated height, a stem in a guide. */
export const fitClearanceParameters = z.strictObject({
	outer: sheetKeySchema,
	inner: sheetKeySchema
});
