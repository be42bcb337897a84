import { expansionPerK, materials } from '$lib/kernel/geometry/expansion';
import { readingOf, type ReadingFound } from '$lib/kernel/measurement/reading';
import type { UncertainBody } from '$lib/kernel/measurement/sources-of-uncertainty';
import { cannot, computed } from '$lib/kernel/outcome';
import type { Step } from '../../working';
import { calculator } from '../calculator';
import { choice, list, quantity } from '../field';
import type { Worked } from '../worked';
import { placesFor } from './measuring/printed';
import { readingSteps } from './measuring/reading-steps';

const length = { dimension: 'length', unit: { metric: 'mm', inch: 'in' } } as const;
const warmth = {
	dimension: 'temperature',
	unit: { metric: '°C', inch: '°F' },
	decimals: 0,
	least: -30,
	most: 150,
	optional: true
} as const;
const made = materials.map(({ key, words }) => ({ value: key, words }));
/** Alloys of one name differ by about a tenth. */
const expansionWithin = 0.1;

/** A reading or the mean of several, with all that makes it uncertain. */
export const reading = calculator({
	key: 'reading',
	title: 'Uncertainty of a reading',
	says: 'What a reading is good for: the mean at 20 °C, plus or minus how much, and which part of it counts most.',
	drawer: 'measuring',
	caution:
		'This counts what you tell it. A dirty anvil, a worn ratchet or the wrong place on the part is not in it, and can be larger than all the rest. Check the zero before and after.',
	formulas: [
		'measurement/repeats',
		'measurement/of-least-count',
		'measurement/temperature',
		'geometry/at-20',
		'measurement/combined-standard',
		'measurement/effective-degrees',
		'measurement/budget'
	],
	sources: [
		'An expansion is taken to be known to a tenth of itself: alloys of one name differ by about that.'
	],
	fields: {
		readings: list({
			...length,
			words: 'Readings of one place',
			hint: 'One or more, with spaces or semicolons between. Lift the instrument off between them.',
			example: '39.991; 39.990; 39.992'
		}),
		leastCount: quantity({
			...length,
			words: 'Least count of the instrument',
			hint: 'What one line or one digit is worth.',
			decimals: 4,
			least: 0.00001,
			most: 10,
			example: '0.001'
		}),
		calibration: quantity({
			...length,
			words: 'Uncertainty of its calibration',
			hint: 'As the certificate prints it, with k = 2.',
			decimals: 4,
			least: 0,
			most: 10,
			optional: true,
			example: '0.002'
		}),
		partC: quantity({ ...warmth, words: 'Temperature of the part', example: '24' }),
		instrumentC: quantity({ ...warmth, words: 'Temperature of the instrument', example: '21' }),
		withinK: quantity({
			words: 'Both temperatures are known to within',
			hint: 'Either way. A hand thermometer on a part is good for about 2.',
			dimension: 'temperatureDifference',
			unit: { metric: '°C', inch: '°F' },
			decimals: 1,
			least: 0,
			most: 30,
			optional: true,
			example: '2'
		}),
		partOf: choice({ words: 'The part is of', options: made, initial: 'steel', example: 'steel' }),
		instrumentOf: choice({
			words: 'The instrument is of',
			options: made,
			initial: 'gauge-steel',
			example: 'gauge-steel'
		})
	},
	work({ readings, leastCount, calibration = 0, partC, instrumentC, withinK = 0, ...of }) {
		if ((partC === undefined) !== (instrumentC === undefined))
			return cannot('give the temperatures of both, part and instrument, or of neither');
		const body = (temperatureC: number, perK: number): UncertainBody => ({
			temperatureC,
			temperatureWithinC: withinK,
			expansionPerK: perK,
			expansionWithinPerK: expansionWithin * perK
		});
		const bodies =
			partC === undefined || instrumentC === undefined
				? undefined
				: {
						part: body(partC, expansionPerK(of.partOf)),
						instrument: body(instrumentC, expansionPerK(of.instrumentOf))
					};
		const asked = {
			readingsMm: readings,
			leastCountMm: leastCount,
			calibrationMm: calibration,
			...(bodies ? { bodies } : {})
		};
		const found = readingOf(asked);
		return found.ok
			? computed(workedOf(found.value, readings, readingSteps(asked, found.value)))
			: found;
	}
});

function workedOf(found: ReadingFound, readingsMm: readonly number[], working: Step[]): Worked {
	const { valueMm, meanMm, correctionMm, budget, repeats } = found;
	const decimals = placesFor(budget.expanded);
	const mm = { unit: 'mm', decimals };
	const largest = budget.lines.reduce((a, b) => (b.share > a.share ? b : a));
	return {
		lines: [
			{
				key: 'value',
				words: correctionMm === 0 ? 'Reading' : 'Reading at 20 °C',
				value: valueMm,
				...mm,
				main: true
			},
			{
				key: 'expanded',
				words: 'Plus or minus, 95 times in 100 (U)',
				value: budget.expanded,
				...mm,
				main: true
			},
			{ key: 'mean', words: 'Mean as read', value: meanMm, ...mm },
			...(repeats
				? [
						{
							key: 'scatter',
							words: 'Scatter of one reading (s)',
							value: repeats.deviation,
							unit: 'mm',
							decimals: decimals + 1
						}
					]
				: []),
			{
				key: 'standard',
				words: 'Standard uncertainty (u)',
				value: budget.standard,
				unit: 'mm',
				decimals: decimals + 1
			},
			{
				key: 'factor',
				words: 'Coverage factor (k)',
				value: budget.coverageFactor,
				unit: '',
				decimals: 2
			},
			{
				key: 'largest',
				words: 'Counts most',
				text: `${largest.name}, ${Math.round(100 * largest.share)} % of it`
			}
		],
		working,
		notes: notesOf(found),
		drawing: {
			kind: 'budget',
			parts: budget.lines.map(({ name, contribution, share }) => ({
				words: name,
				contributionMm: contribution,
				share
			})),
			standardMm: budget.standard,
			readingsMm: readingsMm.map((one) => one + correctionMm),
			valueMm,
			expandedMm: budget.expanded,
			decimals
		}
	};
}

function notesOf({ repeats, budget }: ReadingFound): string[] {
	if (!repeats)
		return [
			'One reading tells nothing of its own scatter. Take three or more, lifting off between.'
		];
	if (repeats.deviation === 0)
		return ['The readings are all alike: the least count hides their scatter, and stands for it.'];
	return budget.coverageFactor > 3
		? [
				`With ${repeats.degreesOfFreedom + 1} readings their scatter is badly known, so k is ${budget.coverageFactor.toFixed(1)}. A few more readings narrow the result a good deal.`
			]
		: [];
}
