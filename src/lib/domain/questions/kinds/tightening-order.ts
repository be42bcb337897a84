import { z } from 'zod';
import { firstWrongStep, loosening, orderFromMiddle } from '$lib/kernel/fasteners/tightening-order';
import { computed, type Outcome } from '$lib/kernel/outcome';
import { fillWords, keysIn } from '../fill-words';
import type { Kind } from '../kind';
import { sheetKeySchema, wordsSchema } from '../words';

export const tighteningOrderBody = z.strictObject({
	prompt: wordsSchema.optional(),
	/** The data sheet's bolt pattern, such as `head.bolts`. */
	pattern: sheetKeySchema,
	direction: z.enum(['tighten', 'loosen']),
	because: wordsSchema
});
export type TighteningOrderBody = z.infer<typeof tighteningOrderBody>;

type Placed = { id: string; xMm: number; yMm: number };
type Drawn = {
	prompt: string;
	because: string;
	bolts: Placed[];
	order: string[];
	printed: boolean;
};
export type OrderFace = { prompt: string; rule: string; bolts: Placed[] };
export type OrderResponse = { order: string[] };

const prompts = {
	tighten: 'In which order are these bolts tightened?',
	loosen: 'In which order are these bolts loosened?'
};

export const tighteningOrder: Kind<TighteningOrderBody, Drawn, OrderFace, OrderResponse> = {
	schema: tighteningOrderBody,
	responseSchema: z.strictObject({ order: z.array(z.string().max(8)).max(40) }),

	sheetKeys: (body) => [body.pattern, ...keysIn(body.prompt, body.because)],
	draw(body, _seed, sheet): Outcome<Drawn> {
		const pattern = sheet.pattern(body.pattern);
		if (!pattern.ok) return pattern;
		const { bolts, printedOrder, words } = pattern.value;
		const sound = printedOrder ? computed(printedOrder) : orderFromMiddle(bolts);
		if (!sound.ok) return sound;
		const prompt = fillWords(body.prompt ?? `${words}. ${prompts[body.direction]}`, sheet);
		if (!prompt.ok) return prompt;
		return computed({
			prompt: prompt.value,
			because: body.because,
			// By name, never in the order of the key: the face must not give it away.
			bolts: [...bolts]
				.map(({ id, xMm, yMm }) => ({ id, xMm, yMm }))
				.sort((a, b) => a.id.localeCompare(b.id)),
			order: body.direction === 'loosen' ? loosening(sound.value) : sound.value,
			printed: printedOrder !== undefined
		});
	},

	face: (_, { prompt, bolts }) => ({
		prompt,
		rule: 'Each bolt in its right place from the first on earns a share, up to the first wrong step.',
		bolts
	}),

	score(_, { order }, response) {
		const departure = firstWrongStep(order, response.order);
		if (!departure.ok) {
			const held = order.findIndex((id, step) => response.order[step] !== id);
			const points = held <= 0 ? 0 : held / order.length;
			return { points, right: false, explain: `The order is not complete: ${departure.because}.` };
		}
		if (departure.value === null)
			return { points: 1, right: true, explain: 'Right from the first bolt to the last.' };
		const { step, was, wanted } = departure.value;
		return {
			points: (step - 1) / order.length,
			right: false,
			explain: `The first wrong step is ${step}: you took ${was}, and ${wanted} comes there.`
		};
	},

	answer: (_, { order }) => ({ words: order.join(', '), order }),
	said: (_body, _drawn, { order }) => (order.length === 0 ? 'nothing given' : order.join(', ')),
	working: (_, { because, printed, order }) => [
		{
			words: printed
				? 'The data sheet prints the order; it wins over any rule.'
				: 'The sheet prints no order: from the middle outwards.'
		},
		{ words: because },
		{ words: 'The order', formula: order.join(' → ') }
	],
	emptyIsOmitted: ({ order }) => order.length === 0
};
