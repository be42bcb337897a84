import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** How far a part has worn beyond its printed size: a journal below, a bore above. */
export const wearParameters = z.strictObject({ of: sheetKeySchema });
