import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** Difference between the two ends of a journal or bore, on the worse axis. */
export const taperParameters = z.strictObject({ of: sheetKeySchema });
