import type { z } from 'zod';
import type { Block } from './blocks';

/** What a letter needs to know of the school that it comes from. */
export type MailSchool = { name: string; locale: string; timeZone: string };

export type MailKind<Schema extends z.ZodObject = z.ZodObject> = {
	name: string;
	payload: Schema;
	/** One-time links: sealed while they wait, never shown on a page, in a log or in the ledger. */
	secret: readonly (keyof z.infer<Schema> & string)[];
	/** Values for the test that renders every kind, and for looking at it. */
	example: z.infer<Schema>;
	subject: (payload: z.infer<Schema>, school: MailSchool | undefined) => string;
	body: (payload: z.infer<Schema>, school: MailSchool | undefined) => Block[];
};

/** Ties the payload's type to what writes the letter. */
export function mailKind<Schema extends z.ZodObject>(kind: MailKind<Schema>): MailKind<Schema> {
	return kind;
}
