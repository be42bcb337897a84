import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** Largest minus smallest of two readings across a journal or bore, at the worst station. */
export const outOfRoundParameters = z.strictObject({ of: sheetKeySchema });
