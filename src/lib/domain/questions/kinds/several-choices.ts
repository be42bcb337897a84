import { z } from 'zod';
import { choiceKeys, drawChoice, rightIds, type DrawnChoice } from '../draw-choice';
import type { Kind } from '../kind';
import { faceOptions, textsOf, type FaceOption } from '../options';
import { shortWordsSchema, wordsSchema } from '../words';

const option = z.strictObject({
	text: shortWordsSchema,
	right: z.boolean(),
	/** Shown after the response where the choice and the truth differ. */
	because: wordsSchema.optional()
});

export const severalChoicesBody = z.strictObject({
	prompt: wordsSchema,
	options: z
		.array(option)
		.min(3)
		.max(10)
		.refine((all) => all.some((one) => one.right), 'at least one option is right')
		.refine((all) => all.some((one) => !one.right), 'at least one option is wrong'),
	/** `shares`: each right choice earns a share, each wrong one costs a share. */
	scoring: z.enum(['shares', 'all-or-nothing']).default('shares'),
	because: wordsSchema
});
export type SeveralChoicesBody = z.infer<typeof severalChoicesBody>;

const rules: Record<SeveralChoicesBody['scoring'], string> = {
	shares:
		'Choose all that apply. Each right choice earns an equal share of the point, each wrong one costs a share. Never less than nothing.',
	'all-or-nothing':
		'Choose all that apply. The point is given for exactly the right choices, else none.'
};

export type SeveralChoicesFace = { prompt: string; rule: string; options: FaceOption[] };
export type SeveralChoicesResponse = { choices: string[] };

export const severalChoices: Kind<
	SeveralChoicesBody,
	DrawnChoice,
	SeveralChoicesFace,
	SeveralChoicesResponse
> = {
	schema: severalChoicesBody,
	responseSchema: z.strictObject({ choices: z.array(z.string().max(8)).max(10) }),

	sheetKeys: choiceKeys,
	draw: drawChoice,

	face: (body, drawn) => ({
		prompt: drawn.prompt,
		rule: rules[body.scoring],
		options: faceOptions(drawn.options)
	}),

	score(body, drawn, response) {
		const chosen = drawn.options.filter((one) => response.choices.includes(one.id));
		const hits = chosen.filter((one) => one.right).length;
		const slips = chosen.length - hits;
		const wanted = rightIds(drawn).length;
		const right = hits === wanted && slips === 0;
		const shares = Math.max(0, (hits - slips) / wanted);
		const points = right ? 1 : body.scoring === 'shares' ? shares : 0;
		return { points, right, explain: explain(drawn, response, hits, slips) };
	},

	answer: (_, drawn) => ({
		words: textsOf(drawn.options, rightIds(drawn)),
		optionIds: rightIds(drawn)
	}),
	said: (_, drawn, response) => textsOf(drawn.options, response.choices),
	working: (_, drawn) => [{ words: drawn.because }],
	emptyIsOmitted: (response) => response.choices.length === 0
};

function explain(
	drawn: DrawnChoice,
	response: SeveralChoicesResponse,
	hits: number,
	slips: number
): string {
	if (response.choices.length === 0) return 'No choice was made.';
	const wanted = rightIds(drawn).length;
	const count = `${hits} of ${wanted} that apply chosen, ${slips} that do not.`;
	const differing = drawn.options
		.filter((one) => one.because && one.right !== response.choices.includes(one.id))
		.map((one) => `“${one.text}”: ${one.because}`);
	return [count, ...differing].join(' ');
}
