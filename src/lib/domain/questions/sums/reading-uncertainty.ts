import { z } from 'zod';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import type { Random } from '$lib/kernel/random/random';
import { reading } from '../../crib/calculators/reading';
import { isFigure } from '../../crib/worked';
import type { SheetFigure } from '../sheet-figures';
import { sheetKeySchema } from '../words';
import { drawWorn, shown } from './draw-reading';
import { sumOf, type DrawnFigures } from './from-calculator';

export const readingUncertaintyParameters = z
	.strictObject({
		/** A size in millimetres that is read. */
		of: sheetKeySchema,
		readings: z.number().int().min(1).max(6),
		/** U of one reading; or of several the scatter, or u of their mean. */
		ask: z.enum(['expanded', 'scatter', 'standard'])
	})
	// U of a mean needs Student's t, which a pocket calculator does not have.
	.refine(({ readings, ask }) => (readings === 1) === (ask === 'expanded'), {
		path: ['ask'],
		message: 'expanded is asked of one reading, scatter and standard of several'
	});

type Parameters = z.infer<typeof readingUncertaintyParameters>;

/**
 * What readings are good for, from least count, calibration and scatter. Least counts of 0.001 to
 * 0.01 mm with a calibration of one to four of them, at most 0.006 mm; readings within three least
 * counts of each other, and never all alike; drawn again where a figure given is nearly the answer.
 */
export const readingUncertainty = sumOf({
	calculator: reading,
	parameters: readingUncertaintyParameters,
	sheetKeys: ({ of }) => [of],
	draw(asked, random, sheet) {
		const figure = sheet.figure(asked.of);
		if (!figure.ok) return figure;
		for (let tries = 0; tries < 40; tries++) {
			const drawn = drawOnce(asked, figure.value, random);
			if (!drawn.ok) return drawn;
			if (isHidden(drawn.value)) return drawn;
		}
		return cannot('the figures would show the answer');
	}
});

type Drawn = DrawnFigures<(typeof reading)['fields']>;

function drawOnce(
	{ readings: count, ask }: Parameters,
	figure: SheetFigure,
	random: Random
): Outcome<Drawn> {
	const leastCount = random.pick([0.001, 0.002, 0.01]);
	const calibration = Math.min(0.006, shown(random.integer(1, 4) * leastCount, 3));
	const readings = drawReadings(figure, count, leastCount, random);
	if (!readings.ok) return readings;
	const mm = { unit: 'mm', decimals: 3 };
	return computed({
		values: {
			readings: readings.value,
			leastCount,
			calibration,
			partC: undefined,
			instrumentC: undefined,
			withinK: undefined,
			partOf: 'steel',
			instrumentOf: 'gauge-steel'
		},
		ask,
		given: [
			...readings.value.map((value, at) => ({
				words: count === 1 ? figure.words : `${figure.words}, reading ${at + 1}`,
				value,
				...mm
			})),
			{ words: 'Least count of the instrument', value: leastCount, ...mm },
			{ words: 'Its calibration, U with k = 2', value: calibration, ...mm }
		],
		prompt: prompts[ask]
	});
}

/** Where one part outweighs the rest the result is that part: then there would be nothing to work out. */
function isHidden({ values, ask, given }: Drawn): boolean {
	const worked = reading.work(values);
	const line = worked.ok && worked.value.lines.find((one) => one.key === ask);
	if (!line || !isFigure(line)) return false;
	return given.every(({ value }) => Math.abs(value - line.value) > 0.08 * line.value);
}

const prompts: Record<Parameters['ask'], string> = {
	expanded:
		'Part and instrument lay at 20 °C. What is the expanded uncertainty (k = 2) of this reading, from least count and calibration?',
	scatter: 'All were taken at one place. What is the scatter s of one reading?',
	standard:
		'All were taken at one place, at 20 °C. What is the standard uncertainty u of their mean, from scatter, least count and calibration?'
};

function drawReadings(
	figure: SheetFigure,
	count: number,
	leastCount: number,
	random: Random
): Outcome<number[]> {
	if (figure.unit !== 'mm') return cannot(`${figure.words} is no length`);
	const size = drawWorn(figure, random);
	if (!size.ok) return size;
	const lines = Math.round(size.value / leastCount);
	for (let tries = 0; tries < 30; tries++) {
		const readings = Array.from({ length: count }, () =>
			shown((lines + random.integer(-1, 2)) * leastCount, 3)
		);
		if (count === 1 || new Set(readings).size > 1) return computed(readings);
	}
	return cannot('the readings would not differ');
}
