import { z } from 'zod';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { ruleReading, type Ruling, type RulingName } from '$lib/kernel/measurement/ruling';
import { seeded } from '$lib/kernel/random/random';
import { withUnit } from '../figure-words';
import { fillWords, keysIn } from '../fill-words';
import type { Kind } from '../kind';
import type { SheetFigure } from '../sheet-figures';
import { sheetKeySchema, shortWordsSchema, wordsSchema } from '../words';

export const rulingBody = z.strictObject({
	prompt: wordsSchema.optional(),
	/** A value of the data sheet that has limits. */
	about: sheetKeySchema,
	/** To build: the printed limits. To run again: the wear limit. */
	purpose: z.enum(['build', 'run-again']),
	instrument: z.strictObject({
		name: shortWordsSchema,
		/** Expanded uncertainty, k = 2, in the value's own unit. */
		uncertainty: z.number().positive()
	}),
	/** Leave out to let the seed choose. */
	aim: z.enum(['within', 'out', 'too-close']).optional(),
	because: wordsSchema.optional()
});
export type RulingBody = z.infer<typeof rulingBody>;

export const rulingChoices: readonly { id: RulingName; words: string }[] = [
	{ id: 'within', words: 'Within' },
	{ id: 'out', words: 'Out' },
	{ id: 'too-close', words: 'Too close to call' }
];
type Limits = { least?: number; most?: number };
type Drawn = {
	prompt: string;
	because: string;
	value: number;
	figure: SheetFigure;
	limits: Limits;
	ruling: Ruling;
};
export type RulingFace = {
	prompt: string;
	reading: string;
	instrument: string;
	limits: string;
	choices: readonly { id: RulingName; words: string }[];
};
export type RulingResponse = { ruling: RulingName | null };

/** The limits that the question is asked about: printed ones to build, the wear limit to run again. */
function limitsOf(figure: SheetFigure, purpose: RulingBody['purpose']): Limits {
	const { least, most, wearLimit, wearsBy } = figure;
	if (purpose === 'build' || wearLimit === undefined) return { least, most };
	return wearsBy === 'growing' ? { most: wearLimit } : { least: wearLimit };
}

/** A reading that lies where the aim says, by one to three uncertainties, as an instrument shows it. */
function readingFor(
	limits: Limits,
	aim: RulingName,
	u: number,
	decimals: number,
	unit: () => number
): number {
	const onMost = limits.most !== undefined && (limits.least === undefined || unit() < 0.5);
	const limit = (onMost ? limits.most : limits.least) ?? 0;
	const outward = onMost ? 1 : -1;
	const step = 10 ** -decimals;
	const far = {
		within: -(1.3 + unit() * 1.4),
		out: 1.3 + unit() * 1.4,
		'too-close': (unit() - 0.5) * 1.4
	}[aim];
	const value = Math.round((limit + outward * far * u) / step) * step;
	return Number(value.toFixed(decimals));
}

export const ruling: Kind<RulingBody, Drawn, RulingFace, RulingResponse> = {
	schema: rulingBody,
	responseSchema: z.strictObject({ ruling: z.enum(['within', 'out', 'too-close']).nullable() }),

	sheetKeys: (body) => [body.about, ...keysIn(body.prompt, body.because)],
	draw(body, seed, sheet): Outcome<Drawn> {
		const found = sheet.figure(body.about);
		if (!found.ok) return found;
		const figure = found.value;
		const limits = limitsOf(figure, body.purpose);
		if (limits.least === undefined && limits.most === undefined)
			return cannot(`${figure.words} has no limit`);
		const random = seeded(`${seed}/reading`);
		const aim = body.aim ?? random.pick(rulingChoices).id;
		const value = readingFor(
			limits,
			aim,
			body.instrument.uncertainty,
			figure.decimals,
			random.unit
		);
		const ruled = ruleReading({
			question: body.purpose,
			value,
			expandedUncertainty: body.instrument.uncertainty,
			...limits
		});
		if (!ruled.ok) return ruled;
		const purpose = body.purpose === 'build' ? 'a fresh build' : 'running again';
		const prompt = fillWords(
			body.prompt ?? `${figure.words}: how do you rule this reading for ${purpose}?`,
			sheet
		);
		if (!prompt.ok) return prompt;
		const because = fillWords(body.because ?? '', sheet);
		if (!because.ok) return because;
		return computed({
			prompt: prompt.value,
			because: because.value,
			value,
			figure,
			limits,
			ruling: ruled.value
		});
	},

	face: (body, { prompt, value, figure }) => ({
		prompt,
		reading: withUnit(value, figure.decimals, figure.unit),
		instrument: `${body.instrument.name}, expanded uncertainty ± ${body.instrument.uncertainty} ${figure.unit} (k = 2)`,
		// The limits are the data sheet's: looking them up is part of the question.
		limits: `Limits: data sheet, “${figure.words}”`,
		choices: rulingChoices
	}),

	score(_, drawn, response) {
		const right = response.ruling === drawn.ruling.ruling;
		return {
			points: right ? 1 : 0,
			right,
			explain: `${drawn.ruling.because} ${drawn.ruling.next}`
		};
	},

	answer: (_, drawn) => ({ words: wordsOf(drawn.ruling.ruling), optionIds: [drawn.ruling.ruling] }),
	said: (_body, _drawn, { ruling: said }) => (said ? wordsOf(said) : 'nothing chosen'),
	working(body, { value, figure, limits, because }) {
		const u = body.instrument.uncertainty;
		const fixed = (one: number) => one.toFixed(figure.decimals);
		const bands = [
			limits.most !== undefined &&
				`within up to ${fixed(limits.most - u)}, out above ${fixed(limits.most + u)}`,
			limits.least !== undefined &&
				`within from ${fixed(limits.least + u)}, out below ${fixed(limits.least - u)}`
		].filter((one) => one !== false);
		return [
			{
				words: 'Limits of the data sheet',
				formula: [limits.least, limits.most]
					.filter((one) => one !== undefined)
					.map(fixed)
					.join(' to '),
				unit: figure.unit
			},
			{ words: 'The guard band is the expanded uncertainty', value: u, unit: figure.unit },
			{ words: 'So', formula: bands.join('; ') },
			{ words: 'The reading', value, unit: figure.unit },
			...(because ? [{ words: because }] : [])
		];
	},
	emptyIsOmitted: ({ ruling: said }) => said === null
};

function wordsOf(name: RulingName): string {
	return rulingChoices.find((one) => one.id === name)?.words ?? name;
}
