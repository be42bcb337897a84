import { z } from 'zod';
import { dimensionSchema, fitSchema, oversizeSchema, shimRangeSchema } from './schema/dimension';
import { fastenerSchema, patternSchema } from './schema/fastener';
import { fluidSchema, layoutSchema, portSchema, weakPointSchema } from './schema/ways';
import { familyKey, words } from './schema/words';

export { sheetKey } from './schema/words';

/** Fewer sourced values than this are no data sheet; more are not needed to begin with. */
export const fewestDimensions = 6;

export const dataSheetSchema = z
	.strictObject({
		code: z.string().regex(/^[A-Z0-9]+(-[A-Z0-9]+)*$/, 'Capitals, digits and hyphens.'),
		key: z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'Small letters, digits and hyphens.'),
		title: words,
		revision: z.string().regex(/^[A-Z]{1,2}$/),
		issuedOn: z.iso.date(),
		drawnBy: words,
		/** Read by anybody, without an account, and offered in the tool crib. */
		public: z.boolean().default(false),
		layout: layoutSchema.optional(),
		partFamilies: z
			.array(
				z.strictObject({
					key: familyKey,
					words,
					material: words.optional(),
					/** Linear expansion of the family's main part, per kelvin. */
					expansionPerK: z.number().positive().max(1e-4).optional()
				})
			)
			.min(1),
		dimensions: z
			.array(dimensionSchema)
			.min(fewestDimensions, `Six values make a usable sheet.`)
			.max(400),
		fits: z.array(fitSchema).default([]),
		fasteners: z.array(fastenerSchema).max(100).default([]),
		patterns: z.array(patternSchema).max(40).default([]),
		oversizes: z.array(oversizeSchema).max(40).default([]),
		shims: z.array(shimRangeSchema).max(10).default([]),
		fluids: z.array(fluidSchema).max(20).default([]),
		ports: z.array(portSchema).max(80).default([]),
		weakPoints: z.array(weakPointSchema).max(40).default([])
	})
	.superRefine((sheet, context) => {
		const keyed = keyedThings(sheet);
		const fault = (message: string) => context.addIssue({ code: 'custom', message });
		const seen = new Set<string>();
		for (const { key } of keyed) {
			if (seen.has(key)) fault(`${key} stands twice`);
			seen.add(key);
		}
		const families = new Set(sheet.partFamilies.map((one) => one.key));
		if (families.size < sheet.partFamilies.length) fault('a part family stands twice');
		for (const { key } of keyed)
			if (!families.has(key.split('.')[0] ?? '')) fault(`${key}: no such part family`);
		for (const one of sheet.weakPoints)
			if (!families.has(one.family)) fault(`${one.key}: no part family ${one.family}`);
		const fasteners = new Set(sheet.fasteners.map((one) => one.key));
		for (const one of sheet.patterns)
			if (!fasteners.has(one.fastener)) fault(`${one.key}: no fastener ${one.fastener}`);
		const dimensions = new Set(sheet.dimensions.map((one) => one.key));
		for (const one of sheet.fits)
			for (const key of [one.clearance, one.outer, one.inner])
				if (!dimensions.has(key))
					fault(`the fit of ${one.clearance} names ${key}, which is no dimension`);
		for (const one of sheet.oversizes)
			if (!dimensions.has(one.of)) fault(`${one.key}: no dimension ${one.of}`);
	});

type Keyed = { key: string };

/** Everything in a sheet that has a key of its own, in the order in which a sheet prints it. */
export function keyedThings(sheet: {
	dimensions: readonly Keyed[];
	fasteners: readonly Keyed[];
	patterns: readonly Keyed[];
	oversizes: readonly Keyed[];
	shims: readonly Keyed[];
	ports: readonly Keyed[];
	weakPoints: readonly Keyed[];
}): Keyed[] {
	const { dimensions, fasteners, patterns, oversizes, shims, ports, weakPoints } = sheet;
	return [
		...dimensions,
		...fasteners,
		...patterns,
		...oversizes,
		...shims,
		...ports,
		...weakPoints
	];
}

export type DataSheet = z.infer<typeof dataSheetSchema>;
/** A sheet as it is written: what has a default may be left out. */
export type DataSheetInput = z.input<typeof dataSheetSchema>;
export type Dimension = DataSheet['dimensions'][number];
export type Fit = DataSheet['fits'][number];
export type Fastener = DataSheet['fasteners'][number];
export type Pattern = DataSheet['patterns'][number];
export type Oversize = DataSheet['oversizes'][number];
export type ShimRange = DataSheet['shims'][number];
export type Port = DataSheet['ports'][number];
export type WeakPoint = DataSheet['weakPoints'][number];
export type Layout = NonNullable<DataSheet['layout']>;
