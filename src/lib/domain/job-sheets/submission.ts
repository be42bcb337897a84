import { z } from 'zod';

/** A reading as typed and as understood; empty cells are kept as null so that a grid keeps its shape. */
const cell = z.number().finite().nullable();

export const findingSchema = z.object({
	id: z.string().min(1).max(26),
	/** The photograph it is pinned in, and where: shares of width and height, from the top left. */
	photographId: z.string(),
	x: z.number().min(0).max(1),
	y: z.number().min(0).max(1),
	words: z.string().trim().min(1, 'Say what is seen there.').max(600),
	because: z.string().trim().max(600).default(''),
	kind: z.enum(['failure', 'consequence', 'earlier-hands', 'sound'])
});
export type Finding = z.infer<typeof findingSchema>;

export const argumentSchema = z.object({
	rootCause: z.string().trim().max(300).default(''),
	chain: z.string().trim().max(3000).default(''),
	ruledOut: z.string().trim().max(2000).default(''),
	notLookedAt: z.string().trim().max(1000).default('')
});

export const submissionBodySchema = z.object({
	readings: z.record(z.string(), z.array(z.array(cell))).default({}),
	notes: z.record(z.string(), z.string().max(3000)).default({}),
	findings: z.array(findingSchema).max(30).default([]),
	argument: argumentSchema.default({ rootCause: '', chain: '', ruledOut: '', notLookedAt: '' }),
	/** Alone, or helped and by whom in which part: it goes onto the certificate. */
	help: z
		.object({ alone: z.boolean(), words: z.string().trim().max(300) })
		.default({ alone: true, words: '' })
});
export type SubmissionBody = z.infer<typeof submissionBodySchema>;

export const emptySubmission: SubmissionBody = submissionBodySchema.parse({});

/** One change that a browser sends: small, so that two devices seldom touch the same thing. */
export const operationSchema = z.discriminatedUnion('kind', [
	z.object({
		kind: z.literal('reading'),
		grid: z.string(),
		row: z.number().int().min(0).max(5),
		column: z.number().int().min(0).max(5),
		valueMm: cell
	}),
	z.object({ kind: z.literal('note'), key: z.string(), words: z.string().max(3000) }),
	z.object({ kind: z.literal('finding'), finding: findingSchema }),
	z.object({ kind: z.literal('remove-finding'), id: z.string() }),
	z.object({ kind: z.literal('argument'), argument: argumentSchema }),
	z.object({
		kind: z.literal('help'),
		help: z.object({ alone: z.boolean(), words: z.string().trim().max(300) })
	})
]);
export type Operation = z.infer<typeof operationSchema>;

/** Applies one operation. Grids take the shape that the job sheet gives them. */
export function applyOperation(
	body: SubmissionBody,
	operation: Operation,
	shapes: Readonly<Record<string, { rows: number; columns: number }>>
): SubmissionBody {
	switch (operation.kind) {
		case 'reading': {
			const shape = shapes[operation.grid];
			if (!shape || operation.row >= shape.rows || operation.column >= shape.columns) return body;
			const grid = Array.from({ length: shape.rows }, (_, row) =>
				Array.from({ length: shape.columns }, (_, column) =>
					row === operation.row && column === operation.column
						? operation.valueMm
						: (body.readings[operation.grid]?.[row]?.[column] ?? null)
				)
			);
			return { ...body, readings: { ...body.readings, [operation.grid]: grid } };
		}
		case 'note':
			return { ...body, notes: { ...body.notes, [operation.key]: operation.words } };
		case 'finding': {
			const others = body.findings.filter((one) => one.id !== operation.finding.id);
			return { ...body, findings: [...others, operation.finding] };
		}
		case 'remove-finding':
			return { ...body, findings: body.findings.filter((one) => one.id !== operation.id) };
		case 'argument':
			return { ...body, argument: operation.argument };
		case 'help':
			return { ...body, help: operation.help };
	}
}
