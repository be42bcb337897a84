import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** The shim that brings a measured lash to the wanted one. */
export const valveShimParameters = z.strictObject({ lash: sheetKeySchema });
