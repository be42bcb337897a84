import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** How much wider a ring's gap stands in a worn bore: pi times the growth of the bore. */
export const ringGapParameters = z.strictObject({ bore: sheetKeySchema, gap: sheetKeySchema });
