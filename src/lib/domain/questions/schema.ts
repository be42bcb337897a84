import { z } from 'zod';
import { numberWithUnitBody } from './kinds/number-with-unit';
import { rulingBody } from './kinds/ruling';
import { severalChoicesBody } from './kinds/several-choices';
import { singleChoiceBody } from './kinds/single-choice';
import { tighteningOrderBody } from './kinds/tightening-order';
import { shortWordsSchema } from './words';

const slug = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'small letters, digits and hyphens');

const envelope = {
	/** Unique in the school; a correction keeps it and makes a new revision. */
	key: slug,
	/** The course outcome that it asks about. */
	outcome: slug,
	/** Where the right answer comes from: a standard, a manual, a lesson of the trade. */
	source: shortWordsSchema,
	/** Where to read again: the lesson's key and a heading's anchor in it. */
	readAgain: z.strictObject({ lesson: slug, anchor: slug }),
	/** The data sheet that its figures come from, such as `av3-1150`. */
	sheet: slug.optional(),
	/** Never drawn by a quiz's plan: asked in practice, or by a quiz that names it. */
	practiceOnly: z.literal(true).optional()
};

export const questionSchema = z.discriminatedUnion('kind', [
	z.strictObject({ ...envelope, kind: z.literal('single-choice'), body: singleChoiceBody }),
	z.strictObject({ ...envelope, kind: z.literal('several-choices'), body: severalChoicesBody }),
	z.strictObject({ ...envelope, kind: z.literal('number-with-unit'), body: numberWithUnitBody }),
	z.strictObject({ ...envelope, kind: z.literal('tightening-order'), body: tighteningOrderBody }),
	z.strictObject({ ...envelope, kind: z.literal('ruling'), body: rulingBody })
]);
export type Question = z.infer<typeof questionSchema>;

/** A file under `lessons/courses/<course>/questions/`: one question, or a list of them. */
export const questionFileSchema = z.union([questionSchema, z.array(questionSchema)]);

export function questionsOf(file: z.infer<typeof questionFileSchema>): Question[] {
	return Array.isArray(file) ? file : [file];
}
