import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** A value to be read off the data sheet: no drawing of lots, the sheet is the question. */
export const sheetValueParameters = z.strictObject({
	of: sheetKeySchema,
	part: z.enum(['nominal', 'least', 'most', 'wearLimit'])
});
