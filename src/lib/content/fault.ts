import type { z } from 'zod';

/** Content that cannot be used stops the build and the start, naming the file and what to mend. */
export class ContentFault extends Error {
	constructor(file: string, because: string, line?: number) {
		super(`${file.replace(/^\//, '')}${line ? `:${line}` : ''}: ${because}`);
		this.name = 'ContentFault';
	}
}

export function parsed<Z extends z.ZodType>(schema: Z, file: string, value: unknown): z.infer<Z> {
	const result = schema.safeParse(value);
	if (result.success) return result.data;
	const faults = result.error.issues.map((one) => `${one.path.join('.')}: ${one.message}`);
	throw new ContentFault(file, faults.join('; '));
}
