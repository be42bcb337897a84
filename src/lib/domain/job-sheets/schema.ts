import { z } from 'zod';
import { sheetKey } from '../data-sheets/schema';
import { markingSchemeSchema } from '../marking/schema';

const slug = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/);
const words = z.string().trim().min(1).max(600);

const shot = z.strictObject({
	key: slug,
	title: words,
	hint: words,
	required: z.boolean().default(true)
});

/** The instrument that a grid is measured with: its resolution and stated uncertainty (k = 2). */
const instrument = z.strictObject({
	words,
	leastCountMm: z.number().positive(),
	calibrationExpandedMm: z.number().min(0)
});

/** A grid of diameters: rows are depths along the part, columns are planes around it. */
const grid = z.strictObject({
	key: slug,
	title: words,
	rows: z.array(words).min(1).max(6),
	columns: z.array(words).min(1).max(6),
	/** The dimension that it measures, for its limits and its decimals. */
	dimension: sheetKey,
	instrument,
	/** Readings outside this are a slip of the pen, not a worn part. */
	plausible: z.strictObject({ leastMm: z.number(), mostMm: z.number() })
});

/** What is computed from the grids, and ruled against the data sheet. */
const result = z.discriminatedUnion('sum', [
	z.strictObject({
		key: slug,
		title: words,
		sum: z.literal('out-of-round'),
		grid: slug,
		limit: sheetKey
	}),
	z.strictObject({ key: slug, title: words, sum: z.literal('taper'), grid: slug, limit: sheetKey }),
	z.strictObject({
		key: slug,
		title: words,
		sum: z.literal('least-diameter'),
		grid: slug,
		limit: sheetKey
	}),
	z.strictObject({
		key: slug,
		title: words,
		sum: z.literal('oil-clearance'),
		bore: slug,
		pin: slug,
		limit: sheetKey
	})
]);

export const jobSheetSchema = z
	.strictObject({
		key: slug,
		title: words,
		engine: slug,
		caution: words,
		intro: words,
		/** What to do at the bench, in order. */
		tasks: z.array(words).min(1),
		shots: z.array(shot).min(1),
		grids: z.array(grid).default([]),
		results: z.array(result).default([]),
		/** The question that readings are ruled for. */
		ruledFor: z.enum(['build', 'run-again']).default('run-again'),
		/** Short written answers beside the readings: tags, what was loose as received. */
		notes: z.array(z.strictObject({ key: slug, title: words, hint: words })).default([]),
		findingsAtLeast: z.number().int().min(0).default(1),
		argument: z.strictObject({ title: words, hint: words }),
		scheme: markingSchemeSchema
	})
	.superRefine((sheet, context) => {
		const grids = new Set(sheet.grids.map((one) => one.key));
		for (const one of sheet.results)
			for (const key of 'grid' in one ? [one.grid] : [one.bore, one.pin])
				if (!grids.has(key))
					context.addIssue({ code: 'custom', message: `${one.key}: no grid ${key}` });
	});

export type JobSheet = z.infer<typeof jobSheetSchema>;
export type ReadingGrid = JobSheet['grids'][number];
export type ResultWanted = JobSheet['results'][number];
