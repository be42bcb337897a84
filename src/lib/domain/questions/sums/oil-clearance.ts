import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** Bearing bore (shells in, cap tightened) minus journal, least or most over a grid. */
export const oilClearanceParameters = z.strictObject({
	bore: sheetKeySchema,
	journal: sheetKeySchema,
	ask: z.enum(['least', 'most'])
});
