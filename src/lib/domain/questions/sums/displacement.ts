import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** Swept volume of one cylinder, or of all of them, from bore and stroke. */
export const displacementParameters = z.strictObject({
	bore: sheetKeySchema,
	stroke: sheetKeySchema,
	cylinders: z.number().int().min(1).max(16)
});
