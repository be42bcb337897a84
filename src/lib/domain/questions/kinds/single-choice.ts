import { z } from 'zod';
import { choiceKeys, drawChoice, rightIds, type DrawnChoice } from '../draw-choice';
import type { Kind } from '../kind';
import { faceOptions, textsOf, type FaceOption } from '../options';
import { shortWordsSchema, wordsSchema } from '../words';

const option = z.strictObject({
	text: shortWordsSchema,
	right: z.literal(true).optional(),
	/** Shown after the response to whoever chose it: why it is not so. */
	because: wordsSchema.optional()
});

export const singleChoiceBody = z.strictObject({
	prompt: wordsSchema,
	options: z
		.array(option)
		.min(3)
		.max(8)
		.refine((all) => all.filter((one) => one.right).length === 1, 'exactly one option is right'),
	/** Why the right one is right. */
	because: wordsSchema
});
export type SingleChoiceBody = z.infer<typeof singleChoiceBody>;

export type SingleChoiceFace = { prompt: string; options: FaceOption[] };
export type SingleChoiceResponse = { choice: string | null };

export const singleChoice: Kind<
	SingleChoiceBody,
	DrawnChoice,
	SingleChoiceFace,
	SingleChoiceResponse
> = {
	schema: singleChoiceBody,
	responseSchema: z.strictObject({ choice: z.string().max(8).nullable() }),

	sheetKeys: choiceKeys,
	draw: drawChoice,

	face: (_, drawn) => ({ prompt: drawn.prompt, options: faceOptions(drawn.options) }),

	score(_, drawn, response) {
		const chosen = drawn.options.find((one) => one.id === response.choice);
		if (!chosen) return { points: 0, right: false, explain: 'No choice was made.' };
		if (chosen.right) return { points: 1, right: true, explain: 'This is the right choice.' };
		return { points: 0, right: false, explain: chosen.because || 'This is not the right choice.' };
	},

	answer: (_, drawn) => ({
		words: textsOf(drawn.options, rightIds(drawn)),
		optionIds: rightIds(drawn)
	}),
	said: (_, drawn, response) => textsOf(drawn.options, response.choice ? [response.choice] : []),
	working: (_, drawn) => [{ words: drawn.because }],
	emptyIsOmitted: (response) => response.choice === null
};
