import { z } from 'zod';
import { sheetKeySchema } from '../words';

/** What to set on the wrench when an extension moves the socket; `ask: fastener` turns it round. */
export const torqueWithExtensionParameters = z.strictObject({
	/** A tightening of the data sheet, such as `head.tightening`; its first torque is used. */
	tightening: sheetKeySchema,
	angle: z.enum(['straight', 'any', 'across']).default('straight'),
	ask: z.enum(['wrench', 'fastener']).default('wrench')
});
