import { at20Mm } from '../geometry/temperature';
import { cannot, computed, type Outcome } from '../outcome';
import { uncertaintyBudget, type Budget } from './budget';
import type { Component } from './component';
import { repeatsOf, type Repeats } from './repeats';
import { ofLeastCount, temperatureComponents, type UncertainBody } from './sources-of-uncertainty';
import { coverageFactor } from './uncertainty';

export type ReadingAsked = {
	readingsMm: readonly number[];
	leastCountMm: number;
	/** U of the calibration, k = 2. */
	calibrationMm: number;
	/** Where temperature counts: the part and the instrument. */
	bodies?: { part: UncertainBody; instrument: UncertainBody };
};
export type ReadingFound = {
	meanMm: number;
	/** What is added to the mean to bring it to 20 °C. */
	correctionMm: number;
	valueMm: number;
	/** Where there were two readings or more. */
	repeats?: Repeats;
	budget: Budget;
};

/**
 * A reading, or the mean of several of one place, brought to 20 °C, with its uncertainty budget.
 * @param asked readings one or more; least count above zero; calibration zero or more
 * @returns value and budget in mm; "cannot" where a figure makes no sense
 * @example readingOf({ readingsMm: [39.991, 39.990, 39.992], leastCountMm: 0.001,
 *   calibrationMm: 0.002 }) // 39.991 mm, U = 0.0025
 */
export function readingOf(asked: ReadingAsked): Outcome<ReadingFound> {
	const { readingsMm, leastCountMm, calibrationMm, bodies } = asked;
	const [first] = readingsMm;
	if (first === undefined) return cannot('no reading is taken yet');
	if (!(leastCountMm > 0) || !Number.isFinite(leastCountMm))
		return cannot('a least count is above zero');
	if (!(calibrationMm >= 0) || !Number.isFinite(calibrationMm))
		return cannot('the uncertainty of a calibration is zero or more');
	const repeats = readingsMm.length > 1 ? repeatsOf(readingsMm) : undefined;
	if (repeats && !repeats.ok) return repeats;
	const meanMm = repeats?.value.mean ?? first;
	const warm = bodies && temperatureComponents(meanMm, bodies.part, bodies.instrument);
	if (warm && !warm.ok) return warm;
	const cold = bodies ? at20Mm(meanMm, bodies.part, bodies.instrument) : computed(meanMm);
	if (!cold.ok) return cold;
	const budget = uncertaintyBudget([
		...(repeats && repeats.value.standard > 0 ? [scatter(repeats.value)] : []),
		known('Least count', ofLeastCount(leastCountMm)),
		...(calibrationMm > 0 ? [known('Calibration', calibrationMm / coverageFactor)] : []),
		...(warm?.value ?? [])
	]);
	if (!budget.ok) return budget;
	return computed({
		meanMm,
		correctionMm: cold.value - meanMm,
		valueMm: cold.value,
		...(repeats ? { repeats: repeats.value } : {}),
		budget: budget.value
	});
}

function scatter({ standard, degreesOfFreedom }: Repeats): Component {
	return { name: 'Scatter of the mean', type: 'A', standard, sensitivity: 1, degreesOfFreedom };
}

function known(name: string, standard: number): Component {
	return { name, type: 'B', standard, sensitivity: 1, degreesOfFreedom: Infinity };
}
