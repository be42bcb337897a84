import { z } from 'zod';
import { sheetKey, sourced, words } from './words';

export const propertyClasses = [
	'4.6',
	'4.8',
	'5.6',
	'5.8',
	'6.8',
	'8.8',
	'9.8',
	'10.9',
	'12.9'
] as const;

const stage = z.union([
	z.strictObject({ torqueNm: z.number().positive() }),
	z.strictObject({ angleDeg: z.number().positive().max(360) })
]);

export const fastenerSchema = z.strictObject({
	key: sheetKey,
	words,
	thread: z.strictObject({ diameterMm: z.number().positive(), pitchMm: z.number().positive() }),
	propertyClass: z.enum(propertyClasses),
	lubrication: words,
	/** Where the maker or a test gives it; else the usual range for the lubrication stands in. */
	nutFactor: z
		.strictObject({ least: z.number().positive().max(1), most: z.number().positive().max(1) })
		.refine((one) => one.most >= one.least, 'The least nut factor lies above the most.')
		.optional(),
	/** Length between head and first loaded thread: with it the load after an angle can be told. */
	gripMm: z.number().positive().optional(),
	count: z.number().int().positive().max(200).optional(),
	/** What is put on it: "hexagon 13 mm", "external six-lobe E12". */
	drive: words.optional(),
	stages: z.array(stage).min(1).max(12),
	/** "Use again", "new each time": what the maker says of fitting it twice. */
	reuse: words,
	yieldTightened: z.boolean().default(false),
	...sourced
});

export const patternSchema = z
	.strictObject({
		key: sheetKey,
		words,
		fastener: sheetKey,
		/** Millimetres in the plane of the joint, origin at the pattern's middle. */
		bolts: z
			.array(z.strictObject({ id: z.string().min(1).max(4), xMm: z.number(), yMm: z.number() }))
			.min(2)
			.max(60),
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
		'The printed order names every bolt once.'
	);
