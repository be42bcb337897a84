import { z } from 'zod';

/** `crankpin.oilClearance`: a part family, then what is meant of it. */
export const sheetKey = z
	.string()
	.regex(/^[a-z][A-Za-z0-9]*(\.[a-z][A-Za-z0-9]*)+$/, 'a key such as crankpin.oilClearance');
const words = z.string().trim().min(1).max(200);
const mm = z.number();

const build = z
	.strictObject({ least: mm, most: mm })
	.refine((one) => one.most >= one.least, 'the least limit lies above the most');

/** One dimension with its limits to build and to run again. */
const dimension = z
	.strictObject({
		key: sheetKey,
		words,
		unit: z.enum(['mm', 'cm3', 'bar', 'degC', 'ratio']).default('mm'),
		/** The last place that is compared: 3 for a micrometer's hundredths with an estimate. */
		decimals: z.number().int().min(0).max(4).default(3),
		nominal: mm.optional(),
		build: build.optional(),
		/** Beyond this it does not run again as it is. */
		runAgain: z.strictObject({ least: mm.optional(), most: mm.optional() }).optional(),
		note: words.optional(),
		source: words
	})
	.refine((one) => one.nominal !== undefined || one.build !== undefined, 'a value or limits');

const stage = z.union([
	z.strictObject({ torqueNm: z.number().positive() }),
	z.strictObject({ angleDeg: z.number().positive().max(360) })
]);

const fastener = z.strictObject({
	key: sheetKey,
	words,
	thread: z.strictObject({ diameterMm: z.number().positive(), pitchMm: z.number().positive() }),
	propertyClass: z.enum(['8.8', '10.9', '12.9']),
	lubrication: words,
	/** Length between head and first loaded thread: with it the load after an angle can be told. */
	gripMm: z.number().positive().optional(),
	stages: z.array(stage).min(1),
	/** "Use again", "new each time": what the maker says of fitting it twice. */
	reuse: words,
	yieldTightened: z.boolean().default(false),
	source: words
});

const pattern = z
	.strictObject({
		key: sheetKey,
		words,
		fastener: sheetKey,
		/** Seen from above, millimetres, origin at the pattern's middle. */
		bolts: z
			.array(z.strictObject({ id: z.string().min(1).max(4), xMm: z.number(), yMm: z.number() }))
			.min(2),
		/** The maker's printed tightening order, by bolt id. */
		printedOrder: z.array(z.string()).optional()
	})
	.refine(
		(one) =>
			!one.printedOrder ||
			[...one.printedOrder].sort().join() ===
				one.bolts
					.map((bolt) => bolt.id)
					.sort()
					.join(),
		'the printed order names every bolt once'
	);

export const dataSheetSchema = z
	.strictObject({
		code: z.string().regex(/^[A-Z0-9]+(-[A-Z0-9]+)*$/),
		key: z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/),
		title: words,
		revision: z.string().regex(/^[A-Z]$/),
		issuedOn: z.iso.date(),
		drawnBy: words,
		partFamilies: z.array(z.strictObject({ key: z.string(), words, material: words.optional() })),
		dimensions: z.array(dimension).min(6),
		fasteners: z.array(fastener).default([]),
		patterns: z.array(pattern).default([]),
		fluids: z.array(z.strictObject({ words, amount: words, kind: words })).default([])
	})
	.superRefine((sheet, context) => {
		const seen = new Set<string>();
		for (const { key } of [...sheet.dimensions, ...sheet.fasteners, ...sheet.patterns]) {
			if (seen.has(key)) context.addIssue({ code: 'custom', message: `${key} stands twice` });
			seen.add(key);
		}
		const families = new Set(sheet.partFamilies.map((one) => one.key));
		for (const { key } of [...sheet.dimensions, ...sheet.fasteners, ...sheet.patterns])
			if (!families.has(key.split('.')[0] ?? ''))
				context.addIssue({ code: 'custom', message: `${key}: no such part family` });
		const fasteners = new Set(sheet.fasteners.map((one) => one.key));
		for (const one of sheet.patterns)
			if (!fasteners.has(one.fastener))
				context.addIssue({ code: 'custom', message: `${one.key}: no fastener ${one.fastener}` });
	});

export type DataSheet = z.infer<typeof dataSheetSchema>;
export type Dimension = DataSheet['dimensions'][number];
export type Fastener = DataSheet['fasteners'][number];
export type Pattern = DataSheet['patterns'][number];
