import { computed, type Outcome } from '$lib/kernel/outcome';
import { fillAll, keysIn } from './fill-words';
import { drawOptions } from './options';
import type { SheetFigures } from './sheet-figures';

type Body = {
	prompt: string;
	because: string;
	options: { text: string; right?: boolean; because?: string }[];
};

/** One sitting's options, words filled from the data sheet, in the order of this sitting. */
export type DrawnChoice = {
	prompt: string;
	because: string;
	options: { id: string; text: string; right: boolean; because: string }[];
};

export function choiceKeys(body: Body): string[] {
	return keysIn(
		body.prompt,
		body.because,
		...body.options.flatMap((one) => [one.text, one.because])
	);
}

export function drawChoice(body: Body, seed: string, sheet: SheetFigures): Outcome<DrawnChoice> {
	const filled = fillAll(
		[body.prompt, body.because, ...body.options.flatMap((one) => [one.text, one.because ?? ''])],
		sheet
	);
	if (!filled.ok) return filled;
	const [prompt = '', because = '', ...texts] = filled.value;
	const options = body.options.map((one, i) => ({
		text: texts[2 * i] ?? '',
		because: texts[2 * i + 1] ?? '',
		right: one.right === true
	}));
	return computed({ prompt, because, options: drawOptions(options, seed) });
}

export function rightIds(drawn: DrawnChoice): string[] {
	return drawn.options.filter((one) => one.right).map((one) => one.id);
}
