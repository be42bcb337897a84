import { z } from 'zod';
import { sheetKey, sourced, words } from './words';

const figure = z.number();
const build = z
	.strictObject({ least: figure, most: figure })
	.refine((one) => one.most >= one.least, 'The least limit lies above the most.');

export const dimensionUnits = [
	'mm',
	'cm3',
	'bar',
	'kPa',
	'degC',
	'deg',
	'ratio',
	'count',
	'N',
	'rpm'
] as const;

/** One dimension with its limits to build and to run again. */
export const dimensionSchema = z
	.strictObject({
		key: sheetKey,
		words,
		unit: z.enum(dimensionUnits).default('mm'),
		/** The last place that is compared: 3 for a micrometer's hundredths with an estimate. */
		decimals: z.number().int().min(0).max(4).default(3),
		nominal: figure.optional(),
		build: build.optional(),
		/** Beyond this it does not run again as it is. */
		runAgain: z.strictObject({ least: figure.optional(), most: figure.optional() }).optional(),
		note: words.optional(),
		...sourced
	})
	.refine((one) => one.nominal !== undefined || one.build !== undefined, 'A value or limits.');

/**
 * Which clearance follows from which two sizes: outer less inner. Where parts are fitted
 * selectively (graded and paired), the limits of the two sizes alone do not give it.
 */
export const fitSchema = z.strictObject({
	clearance: sheetKey,
	outer: sheetKey,
	inner: sheetKey,
	selective: z.boolean().default(false)
});

/** Sizes that a worn part is machined to: a bore's oversizes, a journal's undersizes, as steps above zero. */
export const oversizeSchema = z.strictObject({
	key: sheetKey,
	words,
	/** The dimension that is machined. */
	of: sheetKey,
	kind: z.enum(['oversize', 'undersize']),
	stepsMm: z.array(z.number().positive()).min(1).max(12),
	...sourced
});

/** Shims that can be bought: from, to and by which step. */
export const shimRangeSchema = z
	.strictObject({
		key: sheetKey,
		words,
		fromMm: z.number().positive(),
		toMm: z.number().positive(),
		stepMm: z.number().positive(),
		...sourced
	})
	.refine((one) => one.toMm >= one.fromMm, 'The thickest shim is thinner than the thinnest.');
