import { z } from 'zod';
import { familyKey, longWords, sheetKey, sourced, words } from './words';

/** A drilling, passage or pipe on the way of oil, coolant, fuel or air, from one place to the next. */
export const portSchema = z.strictObject({
	key: sheetKey,
	words,
	carries: z.enum(['oil', 'coolant', 'fuel', 'air']),
	/** Names of places: where one port ends the next begins. */
	from: words,
	to: words,
	diameterMm: z.number().positive().optional(),
	note: words.optional(),
	...sourced
});

/** A known weak point of the design. */
export const weakPointSchema = z.strictObject({
	key: sheetKey,
	words,
	family: familyKey,
	/** What fails, how it shows, what to check. */
	fails: longWords,
	shows: longWords,
	check: longWords,
	...sourced
});

export const fluidSchema = z.strictObject({ words, amount: words, kind: words });

export const layoutSchema = z.strictObject({
	cylinders: z.number().int().min(1).max(16),
	cycle: z.enum(['four-stroke', 'two-stroke']),
	ignition: z.enum(['spark', 'compression']),
	firingOrder: z.array(z.number().int().min(1).max(16)).min(1).max(16)
});
