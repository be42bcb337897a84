import { z } from 'zod';
import { departureFromSound, firstWrongStep, soundSteps } from '$lib/kernel/fasteners/departure';
import {
	loosening,
	orderFromMiddle,
	orderFromOutside
} from '$lib/kernel/fasteners/tightening-order';
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
		const order = orderOf(bolts, printedOrder, body.direction);
		if (!order.ok) return order;
		const prompt = fillWords(body.prompt ?? `${words}. ${prompts[body.direction]}`, sheet);
		if (!prompt.ok) return prompt;
		return computed({
			prompt: prompt.value,
			because: body.because,
			// By name, never in the order of the key: the face must not give it away.
			bolts: [...bolts]
				.map(({ id, xMm, yMm }) => ({ id, xMm, yMm }))
				.sort((a, b) => a.id.localeCompare(b.id)),
			order: order.value,
			printed: printedOrder !== undefined
		});
	},

	face: (_, { prompt, bolts }) => ({
		prompt,
		rule: 'Each bolt in its right place from the first on earns a share, up to the first wrong step.',
		bolts
	}),

	score({ direction }, drawn, response) {
		const { order, printed } = drawn;
		const left = departureOf(drawn, direction, response.order);
		if (!left.ok)
			return {
				points: heldSteps(drawn, direction, response.order) / order.length,
				right: false,
				explain: `The order is not complete: ${left.because}.`
			};
		if (left.value === null)
			return {
				points: 1,
				right: true,
				explain: printed
					? 'Right from the first bolt to the last.'
					: 'Sound from the first bolt to the last. Where none is printed, several orders are.'
			};
		const { step, was, sound } = left.value;
		return {
			points: (step - 1) / order.length,
			right: false,
			explain: `The first wrong step is ${step}: you took ${was}, and ${oneOf(sound)} comes there.`
		};
	},

	answer: (_, { order }) => ({ words: order.join(', '), order }),
	said: (_body, _drawn, { order }) => (order.length === 0 ? 'nothing given' : order.join(', ')),
	working: (_, { because, printed, order }) => [
		{
			words: printed
				? 'The data sheet prints the order; it wins over any rule.'
				: 'The sheet prints no order: a flange is crossed, anything else goes from the middle outwards. Mirror images and bolts at one distance in another turn are as good.'
		},
		{ words: because },
		{ words: 'The order', formula: order.join(' → ') }
	],
	emptyIsOmitted: ({ order }) => order.length === 0
};

function orderOf(
	bolts: readonly Placed[],
	printed: readonly string[] | undefined,
	direction: TighteningOrderBody['direction']
): Outcome<string[]> {
	if (printed) return computed(direction === 'loosen' ? loosening(printed) : [...printed]);
	return direction === 'loosen' ? orderFromOutside(bolts) : orderFromMiddle(bolts);
}

/** A printed order is the only one; where none is printed, every sound one is right. */
function departureOf(
	{ bolts, order, printed }: Drawn,
	direction: TighteningOrderBody['direction'],
	given: readonly string[]
): Outcome<{ step: number; was: string; sound: string[] } | null> {
	if (!printed) return departureFromSound(bolts, given, direction);
	const found = firstWrongStep(order, given);
	if (!found.ok) return found;
	if (!found.value) return computed(null);
	const { step, was, wanted } = found.value;
	return computed({ step, was, sound: [wanted] });
}

/** How far an order holds that has a bolt too few, too many or twice; never all the way. */
function heldSteps(
	{ bolts, order, printed }: Drawn,
	direction: TighteningOrderBody['direction'],
	given: readonly string[]
): number {
	const most = order.length - 1;
	if (printed) {
		const held = order.findIndex((id, step) => given[step] !== id);
		return held < 0 ? most : held;
	}
	const known = given.findIndex(
		(id, at) => given.indexOf(id) < at || !bolts.some((one) => one.id === id)
	);
	const steps = soundSteps(bolts, known < 0 ? given : given.slice(0, known), direction);
	return steps.ok ? Math.min(most, steps.value) : 0;
}

function oneOf(ids: readonly string[]): string {
	return ids.length > 1 ? `${ids.slice(0, -1).join(', ')} or ${ids.at(-1) ?? ''}` : (ids[0] ?? '');
}
