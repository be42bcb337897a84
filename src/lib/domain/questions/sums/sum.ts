import type { z } from 'zod';
import type { Outcome } from '$lib/kernel/outcome';
import type { Random } from '$lib/kernel/random/random';
import type { Step } from '../kind';
import type { SheetFigures } from '../sheet-figures';

/** What the student is told: a measured or printed value with its unit. */
export type Given = { words: string; value: number; unit: string; decimals: number };
export type Expected = { value: number; unit: string; decimals: number };

/**
 * A sum that a number question asks for. It draws inputs that could have been read at a bench
 * and lets the kernel do the arithmetic, for the key as for the tool crib and the job sheets.
 */
export interface Sum<Parameters, Inputs> {
	parameters: z.ZodType<Parameters>;
	sheetKeys(parameters: Parameters): string[];
	draw(parameters: Parameters, random: Random, sheet: SheetFigures): Outcome<Inputs>;
	/** The question in words, when the author gives none. */
	prompt(inputs: Inputs): string;
	given(inputs: Inputs): Given[];
	expected(inputs: Inputs): Outcome<Expected>;
	working(inputs: Inputs): Step[];
}

export type AnySum = Sum<unknown, unknown>;
